import type { LetterType } from '../letterType'
import { TYPE_B } from './typeB'
import { TYPE_E } from './typeE'
import { TYPE_J } from './typeJ'
import { TYPE_K } from './typeK'
import { TYPE_N } from './typeN'
import { TYPE_R } from './typeR'
import { TYPE_S } from './typeS'
import { TYPE_T } from './typeT'
import type { ReferenceFunction } from './referenceFunction'

export type { DirectPiece } from './referenceFunction'

/**
 * ITS-90 reference functions of the letter types.
 * Source: NIST Monograph 175 (1993), coefficients as in NIST Standard Reference Database 60.
 */
export const REFERENCE_FUNCTIONS: Record<LetterType, ReferenceFunction> = {
  B: TYPE_B,
  E: TYPE_E,
  J: TYPE_J,
  K: TYPE_K,
  N: TYPE_N,
  R: TYPE_R,
  S: TYPE_S,
  T: TYPE_T,
}
