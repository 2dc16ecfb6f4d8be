import type { Aircraft } from '#shared/types/workbook'

/** An aircraft as the subject of a versioned write. */
export function aircraftSubject({ id, name }: Aircraft) {
  return { entity: 'aircraft', entityId: id, called: `aircraft "${name}"` } as const
}
