export { THERMOELEMENTS } from './ids'
export type { Thermoelement } from './ids'
export { thermoelementInfo } from './info'
export type { ThermoelementInfo } from './info'
export { canonicalThermoelement, legsOf, pairType, sameThermoelement } from './pairs'
export {
  thermoelementMillivolts,
  thermoelementSensitivityMillivoltsPerKelvin,
} from './thermoelementMillivolts'
export { emfAgainstPlatinum67, platinumLegRange } from './emfAgainstPlatinum67'
export { PLATINUM_LEGS } from './singleLegs'
export type { PlatinumLeg } from './singleLegs'
