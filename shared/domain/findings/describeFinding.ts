import type { Finding } from '../../thermometry/run'
import {
  addsDegreesWords,
  blockMissingWords,
  compensationErrorWords,
  compensationMissingWords,
  displayErrorWords,
  typeMismatchWords,
} from './display'
import type { FigureWords } from './figures'
import type { RunNames } from './names'
import { offScaleWords, outsideRangeWords, tipOutsideRangeWords } from './reading'
import type { FindingWords } from './types'
import {
  harmlessMetalWords,
  legsSwappedWords,
  strayJunctionWords,
  unequalContactsWords,
  wrongConductorWords,
} from './wiring'

/** A finding in plain words: what, why, and what to do. */
export function describeFinding(finding: Finding, names: RunNames, figures: FigureWords): FindingWords {
  switch (finding.code) {
    case 'stray-junction':
      return strayJunctionWords(finding, names, figures)
    case 'legs-swapped':
      return legsSwappedWords(finding, names, figures)
    case 'wrong-conductor':
      return wrongConductorWords(finding, names)
    case 'harmless-metal':
      return harmlessMetalWords(finding, names)
    case 'unequal-contacts':
      return unequalContactsWords(finding, names, figures)
    case 'display-type-mismatch':
      return typeMismatchWords(finding)
    case 'compensation-missing':
      return compensationMissingWords(finding, figures)
    case 'compensation-error':
      return compensationErrorWords(finding, figures)
    case 'compensation-adds-degrees':
      return addsDegreesWords(finding, figures)
    case 'display-error':
      return displayErrorWords(finding, figures)
    case 'reference-block-missing':
      return blockMissingWords()
    case 'outside-conductor-range':
      return outsideRangeWords(finding, names, figures)
    case 'tip-outside-type-range':
      return tipOutsideRangeWords(finding, figures)
    case 'off-scale':
      return offScaleWords(finding, figures)
    default:
      return unknownFinding(finding)
  }
}

/** Does not compile when a code of the solver has no words here. */
function unknownFinding(finding: never): never {
  throw new TypeError(`No words for the finding ${JSON.stringify(finding)}.`)
}
