import type { DraftZone } from '#shared/domain/runDraft'
import { defaultRun } from '#shared/domain/runDraft'
import type { WiringRunInput } from '#shared/schemas/run'
import type { LetterType } from '#shared/thermometry'
import type { RunSurroundings } from '~/stores/runEditor'

const ZONES: readonly DraftZone[] = [
  { key: 'tip', name: 'Exhaust', kind: 'exhaust' },
  { key: 'bay', name: 'Engine bay', kind: 'engine-bay' },
  { key: 'firewall', name: 'Firewall', kind: 'firewall' },
  { key: 'cabin', name: 'Cabin', kind: 'cabin' },
  { key: 'terminals', name: 'Display terminals', kind: 'terminals' },
]

/** Invented temperatures, °C: the sandbox is for trying things out. */
const STATES = [
  { id: 'hangar', name: 'Hangar', zoneCelsius: { tip: 20, bay: 20, firewall: 20, cabin: 20, terminals: 20 } },
  {
    id: 'idle',
    name: 'Ground idle',
    zoneCelsius: { tip: 480, bay: 60, firewall: 45, cabin: 24, terminals: 28 },
  },
  { id: 'climb', name: 'Climb', zoneCelsius: { tip: 740, bay: 95, firewall: 65, cabin: 25, terminals: 33 } },
]

/** What the sandbox starts with: a run of the given type that is right in every part. */
export function sandboxRun(type: LetterType): { surroundings: RunSurroundings; parts: WiringRunInput } {
  let count = 0
  // Counted ids, so that server and browser draw the same run.
  const parts = defaultRun(type, ZONES, () => `part-${++count}`)
  return {
    surroundings: {
      type,
      tipZone: 'tip',
      terminalZone: 'terminals',
      display: {
        typeSetting: type,
        compensation: { kind: 'internal', sensorOffsetKelvin: 0 },
        gainErrorFraction: 0,
        offsetKelvin: 0,
        lowCelsius: null,
        highCelsius: null,
      },
      displayName: 'Display',
      zones: ZONES,
      states: STATES,
    },
    parts,
  }
}
