export { defaultRun } from './defaultRun'
export type { DraftZone } from './defaultRun'
export {
  addJoint,
  canAddJoint,
  changeJoint,
  changeSection,
  changeTerminals,
  crossBothEnds,
  crossLegs,
  removeJoint,
} from './edit'
export { CABLE_CHOICES, cableOf, cableWords, conductorsOf } from './cables'
export type { CableChoice } from './cables'
