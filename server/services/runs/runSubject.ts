import type { Channel } from '#shared/types/workbook'

/** The wiring run of a channel as the subject of a versioned write: found by its channel, whichever row it has. */
export function runSubject({ id, tag }: Channel) {
  return { entity: 'run', entityId: id, called: `wiring run of ${tag}` } as const
}
