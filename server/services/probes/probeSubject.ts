import type { Channel } from '#shared/types/workbook'

/** The probe of a channel as the subject of a versioned write: found by its channel, whichever row it has. */
export function probeSubject({ id, tag }: Channel) {
  return { entity: 'probe', entityId: id, called: `probe of ${tag}` } as const
}
