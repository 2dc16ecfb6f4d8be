import type { LetterType } from '../its90'
import { letterTypeRange } from '../its90'
import type { Thermoelement } from '../thermoelements'
import { pairType, sameThermoelement, thermoelementInfo } from '../thermoelements'
import type { Circuit, CircuitElement } from './circuit'
import { isIsothermal } from './circuit'
import { elementMillivolts } from './elementEmf'
import { compensationCelsius, indicate, indicationError } from './indication'
import type { SwappedStretch } from './swaps'
import { exchangeStretch } from './swaps'
import type { ContactShare, Finding, Leg, Place, RunSolution, ThermocoupleRun } from './types'
import { LEGS } from './types'

/** Below this the sum of rounding errors of the reference functions, not a junction, µV. */
const NEGLIGIBLE_MICROVOLTS = 0.05

function wiringFindings(circuit: Circuit, swaps: readonly SwappedStretch[]): Finding[] {
  const swapped = swaps.map(({ sectionIds, places, microvolts }): Finding => ({
    code: 'legs-swapped',
    sectionIds,
    places,
    microvolts,
  }))
  const uncrossed = swaps.reduce(
    (elements, swap) => exchangeStretch(elements, swap.from, swap.to),
    circuit.elements,
  )
  return [...swapped, ...uncrossed.flatMap(conductorFindings)]
}

function conductorFindings(element: CircuitElement): Finding[] {
  if (element.kind === 'internal') return []
  const { place } = element
  return LEGS.flatMap((leg): Finding[] => {
    const actual = element.conductors[leg]
    const intended = element.intended[leg]
    if (sameThermoelement(actual, intended)) return []
    if (element.kind === 'section') return [{ code: 'wrong-conductor', place, leg, actual, intended }]
    return isIsothermal(element, leg) ? [{ code: 'harmless-metal', place, leg, metal: actual }] : []
  })
}

function strayJunctions(
  run: ThermocoupleRun,
  circuit: Circuit,
  shares: readonly ContactShare[],
  solution: Pick<RunSolution, 'terminalMillivolts' | 'errorKelvin'>,
): Finding[] {
  const { terminalMillivolts, errorKelvin } = solution
  return shares
    .filter((share) => share.place.kind === 'joint' && Math.abs(share.microvolts) >= NEGLIGIBLE_MICROVOLTS)
    .map(({ place, leg, metals, celsius, microvolts }): Finding => {
      const without =
        terminalMillivolts === null
          ? null
          : indicationError(
              indicate(terminalMillivolts - microvolts / 1000, run.display, circuit.referenceCelsius),
              circuit.tipCelsius,
            )
      const kelvin = errorKelvin === null || without === null ? null : errorKelvin - without
      return { code: 'stray-junction', place, leg, metals, celsius, microvolts, kelvin }
    })
}

function outside(
  place: Place,
  leg: Leg | null,
  conductor: Thermoelement | LetterType,
  range: { lowCelsius: number; highCelsius: number },
  celsius: number,
): Finding[] {
  const { lowCelsius, highCelsius } = range
  if (celsius >= lowCelsius && celsius <= highCelsius) return []
  return [{ code: 'outside-conductor-range', place, leg, conductor, celsius, lowCelsius, highCelsius }]
}

/** Why an element's emf could not be worked out: each conductor end beyond its data. */
function rangeFindings(element: CircuitElement): Finding[] {
  if (elementMillivolts(element) !== null) return []
  const { conductors, place, tipSideCelsius, displaySideCelsius } = element
  const pair = pairType(conductors.positive, conductors.negative)
  const sameEnds =
    tipSideCelsius.positive === tipSideCelsius.negative &&
    displaySideCelsius.positive === displaySideCelsius.negative
  if (pair && sameEnds) {
    const range = letterTypeRange(pair.type)
    return [tipSideCelsius.positive, displaySideCelsius.positive].flatMap((celsius) =>
      outside(place, null, pair.type, range, celsius),
    )
  }
  return LEGS.flatMap((leg) => {
    if (isIsothermal(element, leg)) return []
    const info = thermoelementInfo(conductors[leg])
    return [tipSideCelsius[leg], displaySideCelsius[leg]].flatMap((celsius) =>
      outside(place, leg, conductors[leg], info, celsius),
    )
  })
}

function terminalFindings(circuit: Circuit): Finding[] {
  const copper = circuit.elements.find((element) => element.kind === 'internal')
  if (!copper) return []
  const { positive, negative } = copper.tipSideCelsius
  return [{ code: 'unequal-contacts', place: { kind: 'terminals' }, differenceKelvin: positive - negative }]
}

function displayFindings(run: ThermocoupleRun, circuit: Circuit): Finding[] {
  const { display, type } = run
  const { referenceCelsius } = circuit
  const compensated = compensationCelsius(display.compensation, referenceCelsius)
  const findings: Finding[] = []
  if (!circuit.referenceFound) findings.push({ code: 'reference-block-missing' })
  if (display.typeSetting !== type)
    findings.push({ code: 'display-type-mismatch', setting: display.typeSetting, type })
  if (display.compensation.kind === 'none') findings.push({ code: 'compensation-missing', referenceCelsius })
  else if (compensated !== referenceCelsius)
    findings.push({ code: 'compensation-error', compensationCelsius: compensated, referenceCelsius })
  if (display.compensation.kind === 'adds-degrees')
    findings.push({ code: 'compensation-adds-degrees', referenceCelsius })
  if (display.gainErrorFraction !== 0 || display.offsetKelvin !== 0)
    findings.push({
      code: 'display-error',
      gainErrorFraction: display.gainErrorFraction,
      offsetKelvin: display.offsetKelvin,
    })
  if (display.compensation.kind !== 'adds-degrees') {
    const range = letterTypeRange(display.typeSetting)
    findings.push(...outside({ kind: 'display' }, null, display.typeSetting, range, compensated))
  }
  return findings
}

function readingFindings(run: ThermocoupleRun, solution: RunSolution): Finding[] {
  const { indication } = solution
  const range = letterTypeRange(run.type)
  const { tipCelsius } = solution
  // Without a value of the planned type at the reference point there is nothing to hold the reading against.
  const findings = outside({ kind: 'terminals' }, null, run.type, range, solution.referenceCelsius)
  if (tipCelsius < range.lowCelsius || tipCelsius > range.highCelsius)
    findings.push({ code: 'tip-outside-type-range', type: run.type, celsius: tipCelsius, ...range })
  if (indication.kind === 'off-scale-low' || indication.kind === 'off-scale-high')
    findings.push({
      code: 'off-scale',
      direction: indication.kind === 'off-scale-low' ? 'low' : 'high',
      millivolts: (solution.terminalMillivolts ?? 0) + (solution.compensationMillivolts ?? 0),
      limitCelsius: indication.limitCelsius,
    })
  return findings
}

/** Everything to be said about a solved run: the wiring from tip to terminals, the display, the reading. */
export function findFindings(
  run: ThermocoupleRun,
  circuit: Circuit,
  swaps: readonly SwappedStretch[],
  solution: RunSolution,
): Finding[] {
  return [
    ...wiringFindings(circuit, swaps),
    ...strayJunctions(run, circuit, solution.contactShares, solution),
    ...terminalFindings(circuit),
    ...circuit.elements.flatMap(rangeFindings),
    ...displayFindings(run, circuit),
    ...readingFindings(run, solution),
  ]
}
