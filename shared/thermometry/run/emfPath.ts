import type { Thermoelement } from '../thermoelements'
import { thermoelementInfo, thermoelementMillivolts } from '../thermoelements'
import type { CircuitElement } from './circuit'
import { resolveCircuit } from './resolve'
import type { Leg, Place, RunConditions, ThermocoupleRun } from './types'

export interface EmfPoint {
  celsius: number
  /** emf gathered since the positive terminal, mV. */
  millivolts: number
}

/** The part of a leg's path that lies in one stretch of the run. */
export interface PathStretch {
  place: Place
  conductor: Thermoelement
  points: readonly EmfPoint[]
}

/** The circuit on the emf-against-temperature plane: + terminal → tip → − terminal. */
export interface EmfPath {
  /** From the positive terminal to the tip. */
  positive: readonly PathStretch[]
  /** From the tip back to the negative terminal; its last point stands at the emf of the run. */
  negative: readonly PathStretch[]
  /** The same walk along the intended conductors, as one line; null where their data do not reach. */
  intended: readonly EmfPoint[] | null
}

const STEPS = 24

interface Walk {
  conductor: Thermoelement
  fromCelsius: number
  toCelsius: number
}

function sample({ conductor, fromCelsius, toCelsius }: Walk, startMillivolts: number): EmfPoint[] | null {
  // Between equal temperatures nothing is added, whatever the conductor's data.
  if (fromCelsius === toCelsius) return [{ celsius: fromCelsius, millivolts: startMillivolts }]
  const { lowCelsius, highCelsius } = thermoelementInfo(conductor)
  if (Math.min(fromCelsius, toCelsius) < lowCelsius || Math.max(fromCelsius, toCelsius) > highCelsius)
    return null
  const zero = thermoelementMillivolts(conductor, fromCelsius)
  return Array.from({ length: STEPS + 1 }, (_, step) => {
    const celsius = step === STEPS ? toCelsius : fromCelsius + ((toCelsius - fromCelsius) * step) / STEPS
    return { celsius, millivolts: startMillivolts + (thermoelementMillivolts(conductor, celsius) - zero) }
  })
}

function walkOf(element: CircuitElement, leg: Leg): Walk {
  const tipSide = element.tipSideCelsius[leg]
  const displaySide = element.displaySideCelsius[leg]
  const conductor = element.conductors[leg]
  return leg === 'positive'
    ? { conductor, fromCelsius: displaySide, toCelsius: tipSide }
    : { conductor, fromCelsius: tipSide, toCelsius: displaySide }
}

function walkLeg(elements: readonly CircuitElement[], leg: Leg, start: number): PathStretch[] | null {
  const ordered = leg === 'positive' ? [...elements].reverse() : elements
  let millivolts = start
  const stretches: PathStretch[] = []
  for (const element of ordered) {
    const points = sample(walkOf(element, leg), millivolts)
    if (!points) return null
    millivolts = points.at(-1)?.millivolts ?? millivolts
    stretches.push({ place: element.place, conductor: element.conductors[leg], points })
  }
  return stretches
}

function endOf(stretches: readonly PathStretch[]): number {
  return stretches.at(-1)?.points.at(-1)?.millivolts ?? 0
}

/**
 * The path of both legs on the emf-against-temperature plane, with the intended one beside it: where a stray
 * junction sits the path leaves the intended line, and the open end at the terminals is the voltage.
 *
 * @returns null where a conductor is beyond the range of its single-leg data
 * @throws RunInputError as `solveRun`
 * @see R. J. Moffat, The gradient approach to thermocouple circuitry (1962)
 */
export function emfPath(run: ThermocoupleRun, conditions: RunConditions): EmfPath | null {
  const circuit = resolveCircuit(run, conditions)
  const positive = walkLeg(circuit.elements, 'positive', 0)
  const negative = positive && walkLeg(circuit.elements, 'negative', endOf(positive))
  if (!positive || !negative) return null
  const right = circuit.elements.map((element) => ({ ...element, conductors: element.intended }))
  const intendedPositive = walkLeg(right, 'positive', 0)
  const intendedNegative = intendedPositive && walkLeg(right, 'negative', endOf(intendedPositive))
  const intended = intendedNegative && [...intendedPositive, ...intendedNegative].flatMap((s) => s.points)
  return { positive, negative, intended }
}
