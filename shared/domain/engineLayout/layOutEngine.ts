import type { EngineLayout } from '../../schemas/aircraft'
import { layOutChannels } from './channels'
import { EngineLayoutError } from './errors'
import { layOutStates } from './states'
import type { EngineLayOut } from './types'
import { layOutZones, TERMINAL_ZONE } from './zones'

/** Displays are sold with inputs in groups of four. */
const INPUT_GROUP = 4

/**
 * What a new aircraft begins with: zones, operating states with suggested temperatures (°C), channels.
 * The temperatures are common practice without a source and are there to be corrected.
 *
 * @param layout 1 to 12 cylinders
 * @throws EngineLayoutError when a quantity is asked for that the engine has no place for
 */
export function layOutEngine(layout: EngineLayout): EngineLayOut {
  if (layout.cooling === 'air' && layout.quantities.includes('coolant-temperature'))
    throw new EngineLayoutError('quantities', 'An air-cooled engine has no coolant to measure.')
  const zones = layOutZones(layout)
  const channels = layOutChannels(layout)
  return {
    zones,
    states: layOutStates(layout, zones),
    channels,
    display: {
      inputs: Math.ceil(channels.length / INPUT_GROUP) * INPUT_GROUP,
      terminalZone: TERMINAL_ZONE,
    },
  }
}
