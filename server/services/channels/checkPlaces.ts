import type { ChannelFields } from '#shared/schemas/channel'
import type { Transaction } from '~~/server/db/client'
import { conflict, invalidField } from '~~/server/http/appError'
import { channelOnInput } from '~~/server/repositories/displayInputs'
import { findDisplay } from '~~/server/repositories/displays'
import { requireZoneOf } from '../zones/requireZone'

/**
 * Refuses a channel whose tip zone or display is not of this aircraft, or whose input is not there or taken.
 *
 * @param channelId the channel that is being changed; null for a new one
 */
export async function checkPlaces(
  tx: Transaction,
  aircraftId: number,
  channelId: number | null,
  { tipZoneId, displayId, inputNumber }: ChannelFields,
): Promise<void> {
  await requireZoneOf(tx, aircraftId, tipZoneId, 'tipZoneId')
  if (displayId === null || inputNumber === null) return
  const display = await findDisplay(tx, aircraftId, displayId)
  if (!display) throw invalidField('displayId', 'This aircraft has no such display.')
  if (inputNumber > display.inputs)
    throw invalidField('inputNumber', `"${display.name}" has inputs 1 to ${display.inputs}.`)
  const other = await channelOnInput(tx, aircraftId, displayId, inputNumber)
  if (other && other.id !== channelId)
    throw conflict(`Input ${inputNumber} of "${display.name}" is taken by ${other.tag}.`, 'inputNumber')
}
