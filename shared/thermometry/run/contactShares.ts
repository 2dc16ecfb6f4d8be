import { sameThermoelement, thermoelementMillivolts } from '../thermoelements'
import type { Circuit, CircuitElement } from './circuit'
import { isIsothermal } from './circuit'
import { legMillivolts } from './elementEmf'
import type { ContactShare, Leg } from './types'
import { LEGS } from './types'

/**
 * D of an element in one leg: emf of the actual conductor minus that of the intended one, mV, zero at the
 * reference point. Exactly zero where they are the same conductor, whatever the range of its data.
 */
function deviation(element: CircuitElement, leg: Leg, celsius: number, referenceCelsius: number): number {
  const actual = element.conductors[leg]
  const intended = element.intended[leg]
  if (sameThermoelement(actual, intended)) return 0
  const rise = (conductor: typeof actual) =>
    thermoelementMillivolts(conductor, celsius) - thermoelementMillivolts(conductor, referenceCelsius)
  return rise(actual) - rise(intended)
}

function dataReach(circuit: Circuit): boolean {
  return circuit.elements.every((element) =>
    LEGS.every((leg) => {
      const actual = element.conductors[leg]
      const intended = element.intended[leg]
      if (sameThermoelement(actual, intended) || isIsothermal(element, leg)) return true
      return [element.tipSideCelsius[leg], element.displaySideCelsius[leg]].every(
        (celsius) =>
          legMillivolts(actual, leg, celsius, circuit.referenceCelsius) !== null &&
          legMillivolts(intended, leg, celsius, circuit.referenceCelsius) !== null,
      )
    }),
  )
}

/**
 * Shares of the contacts in the emf error: at each contact the step of D across it. Stretches between equal
 * temperatures are left out first, so a copper pin in a plug of one temperature makes no stray junction.
 * The shares add up to the emf error at the terminals.
 *
 * @returns shares other than zero, tip to display; null where single-leg data do not reach
 */
export function contactShares(circuit: Circuit): ContactShare[] | null {
  if (!dataReach(circuit)) return null
  return LEGS.flatMap((leg) => legShares(circuit, leg)).filter((share) => share.microvolts !== 0)
}

/**
 * The element up to which a conductor goes on in its own alloy without a change of temperature. Where it ends the
 * foreign metal begins: a pin of the cable's alloy, or a length in one zone, is not where the junction sits.
 */
function lastOfItsAlloy(elements: readonly CircuitElement[], start: number, leg: Leg): CircuitElement {
  const first = elements[start] as CircuitElement
  const next = elements[start + 1]
  const goesOn =
    next && isIsothermal(next, leg) && sameThermoelement(next.conductors[leg], first.conductors[leg])
  return goesOn ? lastOfItsAlloy(elements, start + 1, leg) : first
}

function legShares(circuit: Circuit, leg: Leg): ContactShare[] {
  const { elements, referenceCelsius } = circuit
  const sign = leg === 'positive' ? 1 : -1
  const other: Leg = leg === 'positive' ? 'negative' : 'positive'
  const live = elements.filter((element) => !isIsothermal(element, leg))
  const first = live[0]
  if (!first) return []
  const tipStep = deviation(first, leg, circuit.tipCelsius, referenceCelsius)
  const shares: ContactShare[] = [
    {
      place: { kind: 'tip' },
      side: 'tip-side',
      leg,
      celsius: circuit.tipCelsius,
      metals: [first.conductors[other], first.conductors[leg]],
      microvolts: sign * tipStep * 1000,
    },
  ]
  live.forEach((element, position) => {
    const contact = lastOfItsAlloy(elements, elements.indexOf(element), leg).displayEnd
    const next = live[position + 1]
    const celsius = element.displaySideCelsius[leg]
    const before = deviation(element, leg, celsius, referenceCelsius)
    const after = next ? deviation(next, leg, celsius, referenceCelsius) : 0
    shares.push({
      ...contact,
      leg,
      celsius,
      metals: [element.conductors[leg], next?.conductors[leg] ?? 'Cu'],
      microvolts: sign * (after - before) * 1000,
    })
  })
  return shares
}
