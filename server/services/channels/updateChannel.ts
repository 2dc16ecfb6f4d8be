import type { UpdateChannelInput } from '#shared/schemas/channel'
import type { Channel } from '#shared/types/workbook'
import { updateChannel as storeChannel } from '~~/server/repositories/channels'
import type { AircraftScope } from '../aircraft/changeAircraft'
import { changeAircraft } from '../aircraft/changeAircraft'
import { recordWrite, requireVersion } from '../aircraft/recordWrite'
import { rewriteReadings } from '../expectedReadings/rewriteReadings'
import { orConflict } from '../orConflict'
import { checkPlaces } from './checkPlaces'
import { channelSubject, requireChannel, tagTaken } from './requireChannel'

/** Changes what a channel is, where it is read and as what, and its readings with it. */
export function updateChannel(
  scope: AircraftScope,
  channelId: number,
  { version, ...fields }: UpdateChannelInput,
): Promise<{ channel: Channel }> {
  const { aircraftId } = scope
  return changeAircraft(scope, async (tx) => {
    const before = await requireChannel(tx, aircraftId, channelId)
    await requireVersion(tx, scope, channelSubject(before), before, version)
    await checkPlaces(tx, aircraftId, channelId, fields)
    await orConflict('channels_aircraft_tag', tagTaken(fields.tag), () =>
      storeChannel(tx, aircraftId, before, fields),
    )
    await rewriteReadings(tx, aircraftId, [channelId])
    const channel = await requireChannel(tx, aircraftId, channelId)
    await recordWrite(tx, scope, {
      action: 'channel.updated',
      entityId: channelId,
      before,
      after: channel,
    })
    return { channel }
  })
}
