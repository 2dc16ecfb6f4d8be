import type { FigureWords } from '#shared/domain/findings'
import type { ContactShare, Leg } from '#shared/thermometry'
import { partIdOf } from './partId'
import type { RunView, StrayModel } from './types'

/** Below this a share is rounding, as in the solver's findings, µV. */
const NEGLIGIBLE_MICROVOLTS = 0.05

/** Whether an odd number of crossings lies between a part and the display, so that its legs are drawn exchanged. */
function crossedBeyond({ run }: RunView, partId: string): boolean {
  if (partId === 'terminals') return false
  const index = run.joints.findIndex(({ id }) => partIdOf({ kind: 'joint', jointId: id }) === partId)
  const crossings = run.joints.slice(index + 1).filter(({ crossed }) => crossed).length
  return (crossings + (run.terminals.crossed ? 1 : 0)) % 2 === 1
}

function kelvinOf({ solution }: RunView, share: ContactShare): number | null {
  for (const finding of solution.findings)
    if (
      finding.code === 'stray-junction' &&
      finding.microvolts === share.microvolts &&
      finding.leg === share.leg &&
      partIdOf(finding.place) === partIdOf(share.place)
    )
      return finding.kelvin
  return null
}

/** Stray junctions of a joint or of the terminals, each on the conductor that is drawn there. */
export function straysAt(view: RunView, partId: string, figures: FigureWords): StrayModel[] {
  const exchanged = crossedBeyond(view, partId)
  const other: Record<Leg, Leg> = { positive: 'negative', negative: 'positive' }
  return view.solution.contactShares
    .filter(
      (share) => partIdOf(share.place) === partId && Math.abs(share.microvolts) >= NEGLIGIBLE_MICROVOLTS,
    )
    .map((share): StrayModel => {
      const kelvin = kelvinOf(view, share)
      return {
        drawnLeg: exchanged ? other[share.leg] : share.leg,
        side: share.side,
        microvolts: figures.microvolts(share.microvolts),
        degrees: kelvin === null ? null : figures.difference(kelvin),
      }
    })
}
