import type { Cause, CauseKind } from '../../thermometry/run'
import type { RunNames } from './names'

const CAUSE_WORDS: Record<CauseKind, string> = {
  'legs-swapped': 'Legs swapped',
  conductors: 'Other alloy',
  'contact-metal': 'Contact metal',
  'terminal-contacts': 'Terminals off the reference point',
  'display-type': 'Type setting',
  compensation: 'Cold-junction compensation',
  'display-error': 'Display’s own error',
}

/** In which order causes are put right; it decides how the error splits. */
export const CAUSE_ORDER_WORDS =
  'Causes are put right one at a time, from the tip to the display; each row is what that step changes, so the rows add up to the whole error. In another order the split would differ, the sum would not.'

/** What a cause of the error is and where, e.g. `Other alloy: section 2, “Extension”`. */
export function describeCause({ kind, place }: Cause, names: RunNames): string {
  return place.kind === 'display' ? CAUSE_WORDS[kind] : `${CAUSE_WORDS[kind]}: ${names.place(place)}`
}
