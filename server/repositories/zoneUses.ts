import { and, asc, eq, or } from 'drizzle-orm'
import type { Executor } from '~~/server/db/client'
import { channels, displays, runJoints, wiringRuns } from '~~/server/db/schema'

/** What stands in the way of removing a zone. */
export interface ZoneUses {
  /** Tags of channels whose tip sits in it. */
  tips: string[]
  joints: { label: string; tag: string }[]
  /** Names of displays whose terminals sit in it. */
  displays: string[]
}

export async function findZoneUses(
  executor: Executor,
  aircraftId: number,
  zoneId: number,
): Promise<ZoneUses> {
  const tips = await executor
    .select({ tag: channels.tag })
    .from(channels)
    .where(and(eq(channels.aircraftId, aircraftId), eq(channels.tipZoneId, zoneId)))
    .orderBy(asc(channels.position))
  const joints = await executor
    .select({ label: runJoints.label, tag: channels.tag })
    .from(runJoints)
    .innerJoin(wiringRuns, eq(wiringRuns.id, runJoints.runId))
    .innerJoin(channels, eq(channels.id, wiringRuns.channelId))
    .where(
      and(
        eq(wiringRuns.aircraftId, aircraftId),
        or(eq(runJoints.tipSideZoneId, zoneId), eq(runJoints.displaySideZoneId, zoneId)),
      ),
    )
    .orderBy(asc(channels.position), asc(runJoints.position))
  const terminals = await executor
    .select({ name: displays.name })
    .from(displays)
    .where(and(eq(displays.aircraftId, aircraftId), eq(displays.terminalZoneId, zoneId)))
    .orderBy(asc(displays.id))
  return { tips: tips.map(({ tag }) => tag), joints, displays: terminals.map(({ name }) => name) }
}
