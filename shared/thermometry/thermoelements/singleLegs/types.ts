import type { DirectPiece } from '../../its90/coefficients'

export interface SingleLegFunction {
  /** True where at least two independent copies of the published figures agreed. */
  verified: boolean
  pieces: readonly [DirectPiece, ...DirectPiece[]]
}
