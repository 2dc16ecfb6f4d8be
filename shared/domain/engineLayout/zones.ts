import type { EngineLayout } from '../../schemas/aircraft'
import type { ZoneKind } from '../../schemas/zone'
import type { LaidOutZone } from './types'

/** A zone of which there is only one is keyed by its kind. */
export const TERMINAL_ZONE = 'terminals'

const COMMON_ZONES: readonly (readonly [ZoneKind, string])[] = [
  ['intake', 'Intake'],
  ['engine-bay', 'Engine bay'],
  ['firewall', 'Firewall, engine side'],
  ['cabin', 'Cabin'],
  ['panel', 'Panel'],
  // The display warms its own terminals, so they are not simply part of the panel.
  [TERMINAL_ZONE, 'Display terminals'],
  ['outside', 'Outside'],
]

/** The key of a zone of which every cylinder has one. */
export function cylinderZone(kind: 'exhaust' | 'cylinder-head', cylinder: number): string {
  return `${kind}-${cylinder}`
}

/** Numbers 1 to `count`. */
export function cylinderNumbers(count: number): number[] {
  return Array.from({ length: count }, (_, index) => index + 1)
}

/** The zones of an engine and the aircraft around it, hot end first. */
export function layOutZones({ cylinders, cooling }: EngineLayout): LaidOutZone[] {
  const numbers = cylinderNumbers(cylinders)
  const single = (kind: ZoneKind, name: string): LaidOutZone => ({ key: kind, name, kind })
  return [
    ...numbers.map((n) => zoneOfCylinder('exhaust', n, 'Exhaust')),
    ...numbers.map((n) => zoneOfCylinder('cylinder-head', n, 'Cylinder head')),
    single('oil', 'Oil'),
    ...(cooling === 'liquid' ? [single('coolant', 'Coolant')] : []),
    ...COMMON_ZONES.map(([kind, name]) => single(kind, name)),
  ]
}

function zoneOfCylinder(kind: 'exhaust' | 'cylinder-head', cylinder: number, name: string): LaidOutZone {
  return { key: cylinderZone(kind, cylinder), name: `${name} ${cylinder}`, kind }
}
