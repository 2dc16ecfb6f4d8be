import type { EngineLayout } from '../../schemas/aircraft'
import type { ZoneKind } from '../../schemas/zone'
import type { LaidOutState, LaidOutZone } from './types'

/** Where the suggested zone temperatures come from; shown wherever they are offered. */
export const SUGGESTED_TEMPERATURES_SOURCE = 'common practice, no source'

type LaidOutKind = Exclude<ZoneKind, 'other'>

interface SuggestedState {
  name: string
  /** °C by kind of zone, for an air-cooled engine on a mild day. */
  celsius: Readonly<Record<LaidOutKind, number>>
  /** Cylinder heads that coolant flows through, °C. */
  liquidCooledHeadCelsius: number
}

/**
 * To be replaced by what is measured on the aircraft; source as `SUGGESTED_TEMPERATURES_SOURCE`.
 * The display's terminals stand a few kelvin above the panel because the display is on whenever it reads.
 */
const SUGGESTED_STATES: readonly SuggestedState[] = [
  {
    name: 'Hangar',
    celsius: {
      exhaust: 18,
      'cylinder-head': 18,
      oil: 18,
      coolant: 18,
      intake: 18,
      'engine-bay': 18,
      firewall: 18,
      cabin: 18,
      panel: 18,
      terminals: 20,
      outside: 18,
    },
    liquidCooledHeadCelsius: 18,
  },
  {
    name: 'Cold start',
    celsius: {
      exhaust: 280,
      'cylinder-head': 45,
      oil: 10,
      coolant: 12,
      intake: 6,
      'engine-bay': 10,
      firewall: 8,
      cabin: 7,
      panel: 8,
      terminals: 11,
      outside: 5,
    },
    liquidCooledHeadCelsius: 25,
  },
  {
    name: 'Ground idle',
    celsius: {
      exhaust: 480,
      'cylinder-head': 125,
      oil: 60,
      coolant: 65,
      intake: 22,
      'engine-bay': 48,
      firewall: 40,
      cabin: 20,
      panel: 22,
      terminals: 26,
      outside: 15,
    },
    liquidCooledHeadCelsius: 80,
  },
  {
    name: 'Climb',
    celsius: {
      exhaust: 690,
      'cylinder-head': 200,
      oil: 98,
      coolant: 92,
      intake: 18,
      'engine-bay': 72,
      firewall: 58,
      cabin: 19,
      panel: 24,
      terminals: 29,
      outside: 9,
    },
    liquidCooledHeadCelsius: 115,
  },
  {
    name: 'Cruise',
    celsius: {
      exhaust: 740,
      'cylinder-head': 175,
      oil: 88,
      coolant: 86,
      intake: 9,
      'engine-bay': 58,
      firewall: 46,
      cabin: 18,
      panel: 23,
      terminals: 28,
      outside: 1,
    },
    liquidCooledHeadCelsius: 105,
  },
  {
    name: 'Heat soak',
    celsius: {
      exhaust: 220,
      'cylinder-head': 150,
      oil: 92,
      coolant: 96,
      intake: 62,
      'engine-bay': 96,
      firewall: 82,
      cabin: 33,
      panel: 35,
      terminals: 38,
      outside: 22,
    },
    liquidCooledHeadCelsius: 102,
  },
]

function suggestedCelsius(state: SuggestedState, zone: LaidOutZone, layout: EngineLayout): number {
  if (zone.kind === 'cylinder-head' && layout.cooling === 'liquid') return state.liquidCooledHeadCelsius
  return state.celsius[zone.kind === 'other' ? 'engine-bay' : zone.kind]
}

/** The operating states of a new aircraft, each with a suggested temperature for every zone given, °C. */
export function layOutStates(layout: EngineLayout, zones: readonly LaidOutZone[]): LaidOutState[] {
  return SUGGESTED_STATES.map((state) => ({
    name: state.name,
    zoneCelsius: Object.fromEntries(zones.map((zone) => [zone.key, suggestedCelsius(state, zone, layout)])),
  }))
}
