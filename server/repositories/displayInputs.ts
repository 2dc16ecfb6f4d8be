import { and, asc, desc, eq } from 'drizzle-orm'
import type { Channel } from '#shared/types/workbook'
import type { Executor } from '~~/server/db/client'
import { channels } from '~~/server/db/schema'

type OnInput = Pick<Channel, 'id' | 'tag'>

/** The channel that sits on an input of a display, if any. */
export async function channelOnInput(
  executor: Executor,
  aircraftId: number,
  displayId: number,
  inputNumber: number,
): Promise<OnInput | undefined> {
  const [channel] = await executor
    .select({ id: channels.id, tag: channels.tag })
    .from(channels)
    .where(
      and(
        eq(channels.aircraftId, aircraftId),
        eq(channels.displayId, displayId),
        eq(channels.inputNumber, inputNumber),
      ),
    )
  return channel
}

/** Tags of the channels a display reads, by input. */
export async function tagsOnDisplay(
  executor: Executor,
  aircraftId: number,
  displayId: number,
): Promise<string[]> {
  const rows = await executor
    .select({ tag: channels.tag })
    .from(channels)
    .where(and(eq(channels.aircraftId, aircraftId), eq(channels.displayId, displayId)))
    .orderBy(asc(channels.inputNumber))
  return rows.map((row) => row.tag)
}

/** The highest input of a display that is in use, and by which channel. */
export async function highestInput(
  executor: Executor,
  aircraftId: number,
  displayId: number,
): Promise<{ tag: string; inputNumber: number | null } | undefined> {
  const [channel] = await executor
    .select({ tag: channels.tag, inputNumber: channels.inputNumber })
    .from(channels)
    .where(and(eq(channels.aircraftId, aircraftId), eq(channels.displayId, displayId)))
    .orderBy(desc(channels.inputNumber))
    .limit(1)
  return channel
}
