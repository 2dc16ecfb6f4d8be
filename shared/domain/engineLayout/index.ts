export { layOutEngine } from './layOutEngine'
export { EngineLayoutError } from './errors'
export { SUGGESTED_TEMPERATURES_SOURCE } from './states'
export type { EngineLayOut } from './types'
