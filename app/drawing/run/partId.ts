import type { Place } from '#shared/thermometry'

/** Id by which drawing, plot and figures know one part of a run. */
export function partIdOf(place: Place): string {
  switch (place.kind) {
    case 'section':
      return `section:${place.sectionId}`
    case 'joint':
      return `joint:${place.jointId}`
    default:
      return place.kind
  }
}
