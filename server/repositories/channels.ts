import { and, asc, count, eq, max } from 'drizzle-orm'
import type { ChannelFields } from '#shared/schemas/channel'
import type { Channel } from '#shared/types/workbook'
import type { Executor, Transaction } from '~~/server/db/client'
import { channels } from '~~/server/db/schema'

const channelColumns = {
  id: channels.id,
  version: channels.version,
  position: channels.position,
  tag: channels.tag,
  quantity: channels.quantity,
  cylinder: channels.cylinder,
  sensor: channels.sensor,
  thermocoupleType: channels.thermocoupleType,
  tipZoneId: channels.tipZoneId,
  displayId: channels.displayId,
  inputNumber: channels.inputNumber,
  typeSetting: channels.typeSetting,
  workingLowCelsius: channels.workingLowCelsius,
  workingHighCelsius: channels.workingHighCelsius,
  notes: channels.notes,
}

type ChannelValues = ChannelFields & { position: number }

const inOrder = [asc(channels.position), asc(channels.id)]

/** Every channel of an aircraft in its order. */
export function listChannels(executor: Executor, aircraftId: number): Promise<Channel[]> {
  return executor
    .select(channelColumns)
    .from(channels)
    .where(eq(channels.aircraftId, aircraftId))
    .orderBy(...inOrder)
}

/** One page of the channels of an aircraft in its order. */
export function pageOfChannels(
  executor: Executor,
  aircraftId: number,
  { page, pageSize }: { page: number; pageSize: number },
): Promise<Channel[]> {
  return executor
    .select(channelColumns)
    .from(channels)
    .where(eq(channels.aircraftId, aircraftId))
    .orderBy(...inOrder)
    .limit(pageSize)
    .offset((page - 1) * pageSize)
}

export async function countChannels(executor: Executor, aircraftId: number): Promise<number> {
  const [row] = await executor
    .select({ total: count() })
    .from(channels)
    .where(eq(channels.aircraftId, aircraftId))
  return row?.total ?? 0
}

export async function findChannel(
  executor: Executor,
  aircraftId: number,
  channelId: number,
): Promise<Channel | undefined> {
  const [channel] = await executor
    .select(channelColumns)
    .from(channels)
    .where(and(eq(channels.aircraftId, aircraftId), eq(channels.id, channelId)))
  return channel
}

/** The position after the last channel. */
export async function nextChannelPosition(executor: Executor, aircraftId: number): Promise<number> {
  const [row] = await executor
    .select({ last: max(channels.position) })
    .from(channels)
    .where(eq(channels.aircraftId, aircraftId))
  return (row?.last ?? -1) + 1
}

/** Ids in the order of the values given. */
export async function insertChannels(
  tx: Transaction,
  aircraftId: number,
  values: readonly ChannelValues[],
): Promise<number[]> {
  if (values.length === 0) return []
  const rows = await tx
    .insert(channels)
    .values(values.map((channel) => ({ ...channel, aircraftId })))
    .$returningId()
  return rows.map((row) => row.id)
}

export async function insertChannel(
  tx: Transaction,
  aircraftId: number,
  values: ChannelValues,
): Promise<number> {
  const [id] = await insertChannels(tx, aircraftId, [values])
  if (id === undefined) throw new Error('The channel was stored without an id.')
  return id
}

export async function updateChannel(
  tx: Transaction,
  aircraftId: number,
  channel: Pick<Channel, 'id' | 'version'>,
  values: ChannelFields,
): Promise<void> {
  await tx
    .update(channels)
    .set({ ...values, version: channel.version + 1 })
    .where(and(eq(channels.aircraftId, aircraftId), eq(channels.id, channel.id)))
}

/** Its probe, its run and its expected readings go with it. */
export async function deleteChannel(tx: Transaction, aircraftId: number, channelId: number): Promise<void> {
  await tx.delete(channels).where(and(eq(channels.aircraftId, aircraftId), eq(channels.id, channelId)))
}
