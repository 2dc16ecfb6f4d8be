import type { Comparison } from '../comparison'
import { conductors } from './conductors'
import { inverseFunctions, letterTables } from './letterTypes'
import { crossedLegs, legPairs } from './singleLegs'

/** Everything of which published figures are at hand. */
export const COMPARISONS: readonly Comparison[] = [
  ...letterTables,
  ...inverseFunctions,
  ...legPairs,
  ...crossedLegs,
  ...conductors,
]
