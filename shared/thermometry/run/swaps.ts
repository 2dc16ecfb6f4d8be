import { sameThermoelement } from '../thermoelements'
import type { Circuit, CircuitElement } from './circuit'
import { exchangeLegs } from './circuit'
import { totalMillivolts } from './elementEmf'
import { boundaryAfter } from './resolve'
import type { Place, ThermocoupleRun } from './types'

/** Neighbouring sections whose legs lie reversed, and the places where they were swapped. */
export interface SwappedStretch {
  /** First and last element index, inclusive. */
  from: number
  to: number
  sectionIds: string[]
  places: Place[]
  /** What the swap adds to the emf at the terminals, µV; null when the data do not reach. */
  microvolts: number | null
}

/** A copy of the elements with the legs of one stretch exchanged. */
export function exchangeStretch(
  elements: readonly CircuitElement[],
  from: number,
  to: number,
): CircuitElement[] {
  return elements.map((element, index) =>
    index < from || index > to ? element : { ...element, conductors: exchangeLegs(element.conductors) },
  )
}

/** Finds each stretch of swapped legs, tip to display. A stretch of equal conductors (copper, copper) is none. */
export function findSwaps(run: ThermocoupleRun, circuit: Circuit): SwappedStretch[] {
  const { elements } = circuit
  const sectionElements = elements.flatMap((element, index) => (element.kind === 'section' ? [index] : []))
  const reversed = (section: number) => elements[sectionElements[section] ?? -1]?.reversed ?? false
  const swaps: SwappedStretch[] = []
  for (let first = 0; first < run.sections.length; first++) {
    if (!reversed(first)) continue
    let last = first
    while (reversed(last + 1)) last++
    const from = sectionElements[first] as number
    const to = sectionElements[last] as number
    if (matters(elements.slice(from, to + 1)))
      swaps.push({
        from,
        to,
        sectionIds: run.sections.slice(first, last + 1).map((section) => section.id),
        places: [...(first > 0 ? [boundaryAfter(run, first - 1)] : []), boundaryAfter(run, last)],
        microvolts: swapMicrovolts(elements, from, to),
      })
    first = last
  }
  return swaps
}

function matters(stretch: readonly CircuitElement[]): boolean {
  return stretch.some(({ conductors }) => !sameThermoelement(conductors.positive, conductors.negative))
}

function swapMicrovolts(elements: readonly CircuitElement[], from: number, to: number): number | null {
  const stretch = elements.slice(from, to + 1)
  const asBuilt = totalMillivolts(stretch)
  const exchanged = totalMillivolts(exchangeStretch(stretch, 0, stretch.length - 1))
  return asBuilt === null || exchanged === null ? null : (asBuilt - exchanged) * 1000
}
