import { sameThermoelement } from '../thermoelements'
import type { Circuit, CircuitElement } from './circuit'
import { totalMillivolts } from './elementEmf'
import { compensationCelsius, indicate, indicationError } from './indication'
import type { SwappedStretch } from './swaps'
import { exchangeStretch } from './swaps'
import type { Cause, DisplayInput, Place, ThermocoupleRun } from './types'
import { LEGS } from './types'

/** The circuit and the display part of the way through being put right. */
interface Stage {
  elements: CircuitElement[]
  display: DisplayInput
}

interface Repair {
  kind: Cause['kind']
  place: Place
  apply: (stage: Stage) => Stage
}

function asIntended(element: CircuitElement): boolean {
  return LEGS.every((leg) => sameThermoelement(element.conductors[leg], element.intended[leg]))
}

function replaceElement(index: number, change: (element: CircuitElement) => CircuitElement) {
  return (stage: Stage): Stage => ({
    ...stage,
    elements: stage.elements.map((element, i) => (i === index ? change(element) : element)),
  })
}

/** Conductors to renew, judged with every swap already put right. */
function conductorRepair(element: CircuitElement, index: number): Repair[] {
  if (element.kind === 'internal' || asIntended(element)) return []
  return [
    {
      kind: element.kind === 'joint' ? 'contact-metal' : 'conductors',
      place: element.place,
      apply: replaceElement(index, (current) => ({ ...current, conductors: current.intended })),
    },
  ]
}

function swapRepair(swap: SwappedStretch): Repair {
  return {
    kind: 'legs-swapped',
    place: swap.places[0] ?? { kind: 'terminals' },
    apply: (stage) => ({ ...stage, elements: exchangeStretch(stage.elements, swap.from, swap.to) }),
  }
}

function circuitRepairs(circuit: Circuit, swaps: readonly SwappedStretch[]): Repair[] {
  const uncrossed = swaps.reduce(
    (elements, swap) => exchangeStretch(elements, swap.from, swap.to),
    circuit.elements,
  )
  return uncrossed.flatMap((element, index) => [
    ...swaps.filter((swap) => swap.from === index).map(swapRepair),
    ...conductorRepair(element, index),
  ])
}

/** Terminals away from the reference point: the last section is brought to it and the display's copper drops out. */
function terminalRepair(circuit: Circuit): Repair[] {
  const last = circuit.elements.length - 1
  const copper = circuit.elements[last]
  if (copper?.kind !== 'internal') return []
  const level = copper.displaySideCelsius
  return [
    {
      kind: 'terminal-contacts',
      place: { kind: 'terminals' },
      apply: (stage) => ({
        ...stage,
        elements: stage.elements
          .slice(0, last)
          .map((element, i) => (i === last - 1 ? { ...element, displaySideCelsius: level } : element)),
      }),
    },
  ]
}

function displayRepairs(run: ThermocoupleRun, circuit: Circuit): Repair[] {
  const { display } = run
  const place: Place = { kind: 'display' }
  const repairs: Repair[] = []
  const repair = (kind: Cause['kind'], change: Partial<DisplayInput>) =>
    repairs.push({
      kind,
      place,
      apply: (stage) => ({ ...stage, display: { ...stage.display, ...change } }),
    })
  if (display.typeSetting !== run.type) repair('display-type', { typeSetting: run.type })
  const compensated = compensationCelsius(display.compensation, circuit.referenceCelsius)
  if (compensated !== circuit.referenceCelsius || display.compensation.kind === 'adds-degrees')
    repair('compensation', { compensation: { kind: 'fixed', celsius: circuit.referenceCelsius } })
  if (display.gainErrorFraction !== 0 || display.offsetKelvin !== 0)
    repair('display-error', { gainErrorFraction: 0, offsetKelvin: 0 })
  return repairs
}

/**
 * Splits the error by cause: the causes are put right one at a time from tip to display, each step being the
 * share of its cause, so the steps add up to the whole error. µV only where a step is off scale.
 */
export function splitByCause(
  run: ThermocoupleRun,
  circuit: Circuit,
  swaps: readonly SwappedStretch[],
): Cause[] {
  let stage: Stage = { elements: circuit.elements, display: run.display }
  const look = (at: Stage) => {
    const millivolts = totalMillivolts(at.elements)
    const shown = indicate(millivolts, at.display, circuit.referenceCelsius)
    return { millivolts, error: indicationError(shown, circuit.tipCelsius) }
  }
  let before = look(stage)
  const repairs = [
    ...circuitRepairs(circuit, swaps),
    ...terminalRepair(circuit),
    ...displayRepairs(run, circuit),
  ]
  const causes = repairs.map(({ kind, place, apply }): Cause => {
    const inDisplay = place.kind === 'display'
    stage = apply(stage)
    const after = look(stage)
    const emfKnown = before.millivolts !== null && after.millivolts !== null && !inDisplay
    const cause: Cause = {
      kind,
      place,
      microvolts: emfKnown ? ((before.millivolts ?? 0) - (after.millivolts ?? 0)) * 1000 : null,
      kelvin: before.error !== null && after.error !== null ? before.error - after.error : null,
    }
    before = after
    return cause
  })
  // One step off scale leaves the others without a sum to belong to.
  return causes.every((cause) => cause.kelvin !== null)
    ? causes
    : causes.map((cause) => ({ ...cause, kelvin: null }))
}
