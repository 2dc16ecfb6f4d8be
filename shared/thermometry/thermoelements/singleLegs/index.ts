import { B_LEGS } from './bLegs'
import { J_LEGS } from './jLegs'
import { K_LEGS } from './kLegs'
import { N_LEGS } from './nLegs'
import { T_LEGS } from './tLegs'
import type { SingleLegFunction } from './types'

export const PLATINUM_LEGS = ['KP', 'KN', 'EN', 'TP', 'JP', 'JN', 'NP', 'NN', 'BP', 'BN'] as const
export type PlatinumLeg = (typeof PLATINUM_LEGS)[number]

/**
 * Single thermoelements against platinum Pt-67, mV, reference junction at 0 °C.
 * Source: NIST Monograph 175 (1993), single-leg tables.
 */
export const SINGLE_LEG_FUNCTIONS: Record<PlatinumLeg, SingleLegFunction> = {
  ...K_LEGS,
  ...T_LEGS,
  ...J_LEGS,
  ...N_LEGS,
  ...B_LEGS,
}
