import type { CreateChannelInput } from '#shared/schemas/channel'
import type { Channel } from '#shared/types/workbook'
import { insertChannel, nextChannelPosition } from '~~/server/repositories/channels'
import type { AircraftScope } from '../aircraft/changeAircraft'
import { changeAircraft } from '../aircraft/changeAircraft'
import { recordWrite } from '../aircraft/recordWrite'
import { orConflict } from '../orConflict'
import { checkPlaces } from './checkPlaces'
import { requireChannel, tagTaken } from './requireChannel'

/** Plans another channel, after those that are there. It has no run yet, so there is nothing to solve. */
export function createChannel(
  scope: AircraftScope,
  input: CreateChannelInput,
): Promise<{ channel: Channel }> {
  const { aircraftId } = scope
  return changeAircraft(scope, async (tx) => {
    await checkPlaces(tx, aircraftId, null, input)
    const position = await nextChannelPosition(tx, aircraftId)
    const channelId = await orConflict('channels_aircraft_tag', tagTaken(input.tag), () =>
      insertChannel(tx, aircraftId, { ...input, position }),
    )
    const channel = await requireChannel(tx, aircraftId, channelId)
    await recordWrite(tx, scope, {
      action: 'channel.created',
      entityId: channelId,
      before: null,
      after: channel,
    })
    return { channel }
  })
}
