import { emfMillivolts, letterTypeRange } from '../its90'
import type { Circuit, CircuitElement } from './circuit'
import { splitByCause } from './causes'
import { contactShares } from './contactShares'
import { elementMillivolts, legMillivolts, pairMillivolts, totalMillivolts } from './elementEmf'
import { findFindings } from './findings'
import { compensationCelsius, compensationMillivolts, indicate, indicationError } from './indication'
import { resolveCircuit } from './resolve'
import { findSwaps } from './swaps'
import type { Contribution, RunConditions, RunSolution, ThermocoupleRun } from './types'

function contribution(element: CircuitElement): Contribution {
  const { place, conductors, intended, reversed, tipSideCelsius, displaySideCelsius } = element
  const leg = (name: 'positive' | 'negative') =>
    legMillivolts(conductors[name], name, tipSideCelsius[name], displaySideCelsius[name])
  return {
    place,
    conductors,
    intended,
    reversed,
    tipSideCelsius,
    displaySideCelsius,
    legMillivolts: { positive: leg('positive'), negative: leg('negative') },
    millivolts: elementMillivolts(element),
    intendedMillivolts: pairMillivolts(intended, tipSideCelsius, displaySideCelsius),
  }
}

/** emf that the planned type delivers between tip and reference point, mV; null beyond its range. */
function plannedMillivolts({ type, tipCelsius, referenceCelsius }: Circuit): number | null {
  const { lowCelsius, highCelsius } = letterTypeRange(type)
  const holds = (celsius: number) => celsius >= lowCelsius && celsius <= highCelsius
  if (!holds(tipCelsius) || !holds(referenceCelsius)) return null
  return emfMillivolts(type, tipCelsius) - emfMillivolts(type, referenceCelsius)
}

/**
 * Works out what a run delivers and what its display shows, why, and what is wrong.
 *
 * emf arises along conductors in temperature gradients: V = Σ over stretches of [E_m(T_end) − E_m(T_start)],
 * walking from the positive terminal to the tip and back to the negative terminal. A conductor beyond the range
 * of its data is a finding that withholds the number; a display driven off scale is an answer.
 *
 * @param run the circuit as built; temperatures in °C, offsets in kelvin
 * @param conditions temperature of every zone the run names, °C
 * @returns emf in mV, shares in µV, errors in kelvin; shares add up to the emf error, causes to the whole error
 * @throws RunInputError when joints do not fit sections, a joint of two zones lacks its metal, or a zone has no
 *   temperature
 * @see ASTM MNL 12, Manual on the Use of Thermocouples in Temperature Measurement (laws of homogeneous
 *   conductors, intermediate metals and intermediate temperatures)
 */
export function solveRun(run: ThermocoupleRun, conditions: RunConditions): RunSolution {
  const circuit = resolveCircuit(run, conditions)
  const swaps = findSwaps(run, circuit)
  const { tipCelsius, referenceCelsius } = circuit
  const compensated = compensationCelsius(run.display.compensation, referenceCelsius)
  const intendedMillivolts = plannedMillivolts(circuit)
  const asBuilt = totalMillivolts(circuit.elements)
  const usable = circuit.referenceFound && asBuilt !== null && intendedMillivolts !== null
  const terminalMillivolts = usable ? asBuilt : null
  const indication = indicate(terminalMillivolts, run.display, referenceCelsius)
  const solution: RunSolution = {
    tipCelsius,
    referenceCelsius,
    compensationCelsius: compensated,
    compensationMillivolts: compensationMillivolts(run.display, compensated),
    terminalMillivolts,
    intendedMillivolts,
    emfErrorMicrovolts: usable ? (asBuilt - intendedMillivolts) * 1000 : null,
    indication,
    errorKelvin: indicationError(indication, tipCelsius),
    contributions: circuit.elements.map(contribution),
    contactShares: usable ? (contactShares(circuit) ?? []) : [],
    causes: usable ? splitByCause(run, circuit, swaps) : [],
    findings: [],
  }
  return { ...solution, findings: findFindings(run, circuit, swaps, solution) }
}
