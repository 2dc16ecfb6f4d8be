import type { OperatingConditions, RunStatesSolution, ThermocoupleRun } from '../thermometry/run'
import { solveRunOverStates } from '../thermometry/run'
import type { Channel, Display, WiringRun, ZoneGrid } from '../types/workbook'

/** The key under which a zone of the workbook appears in a run and in its conditions. */
export function zoneKey(zoneId: number): string {
  return String(zoneId)
}

/** What of a run's record the solver needs; a run being edited has it too. */
export type RunParts = Pick<WiringRun, 'sections' | 'joints' | 'terminals'>

type SolvedChannel = Pick<Channel, 'thermocoupleType' | 'tipZoneId' | 'typeSetting'>
type SolvedDisplay = Pick<
  Display,
  'terminalZoneId' | 'compensation' | 'gainErrorFraction' | 'offsetKelvin' | 'lowCelsius' | 'highCelsius'
>

/**
 * Puts a channel, its display and its wiring run together as the circuit the solver takes.
 *
 * @returns null when there is no circuit yet: not a thermocouple, or no run, display or type setting
 */
export function toThermocoupleRun(
  channel: SolvedChannel,
  display: SolvedDisplay | null,
  run: RunParts | null,
): ThermocoupleRun | null {
  const { thermocoupleType, tipZoneId, typeSetting } = channel
  if (!display || !run || thermocoupleType === null || tipZoneId === null || typeSetting === null) return null
  return {
    type: thermocoupleType,
    tipZone: zoneKey(tipZoneId),
    sections: run.sections.map(({ id, label, positive, negative }) => ({ id, label, positive, negative })),
    joints: run.joints,
    terminals: { ...run.terminals, zone: zoneKey(display.terminalZoneId) },
    display: {
      typeSetting,
      compensation: display.compensation,
      gainErrorFraction: display.gainErrorFraction,
      offsetKelvin: display.offsetKelvin,
      lowCelsius: display.lowCelsius,
      highCelsius: display.highCelsius,
    },
  }
}

/** Operating states of an aircraft in their order, each with the temperature of every zone, °C. */
export function toOperatingConditions(grid: ZoneGrid): OperatingConditions[] {
  const byState = new Map<number, Record<string, number>>()
  for (const { stateId, zoneId, celsius } of grid.temperatures) {
    const zones = byState.get(stateId) ?? {}
    zones[zoneKey(zoneId)] = celsius
    byState.set(stateId, zones)
  }
  return [...grid.states]
    .sort((a, b) => a.position - b.position)
    .map((state) => ({ id: String(state.id), name: state.name, zoneCelsius: byState.get(state.id) ?? {} }))
}

/**
 * What a channel should read in every operating state: the one call behind sheet, table and stored readings.
 *
 * @returns null when there is no circuit to solve yet
 * @throws RunInputError when a zone of the run has no temperature in some state
 */
export function solveChannel(
  channel: SolvedChannel,
  display: SolvedDisplay | null,
  run: RunParts | null,
  grid: ZoneGrid,
): RunStatesSolution | null {
  const circuit = toThermocoupleRun(channel, display, run)
  return circuit && solveRunOverStates(circuit, toOperatingConditions(grid))
}
