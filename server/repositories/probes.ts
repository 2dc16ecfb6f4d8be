import { and, eq } from 'drizzle-orm'
import type { LogProbeInput } from '#shared/schemas/probe'
import type { Probe } from '#shared/types/workbook'
import type { Executor, Transaction } from '~~/server/db/client'
import { probes } from '~~/server/db/schema'

type ProbeValues = Omit<LogProbeInput, 'version'>
type LoggedProbe = ProbeValues & Pick<Probe, 'version'>

const probeColumns = {
  id: probes.id,
  version: probes.version,
  channelId: probes.channelId,
  marking: probes.marking,
  thermocoupleType: probes.thermocoupleType,
  tipStyle: probes.tipStyle,
  style: probes.style,
  leadLengthMetres: probes.leadLengthMetres,
  notes: probes.notes,
  loggedAt: probes.loggedAt,
}

export async function findProbe(
  executor: Executor,
  aircraftId: number,
  channelId: number,
): Promise<Probe | null> {
  const [row] = await executor
    .select(probeColumns)
    .from(probes)
    .where(and(eq(probes.aircraftId, aircraftId), eq(probes.channelId, channelId)))
  return row ? { ...row, loggedAt: row.loggedAt.toISOString() } : null
}

/** Channels of an aircraft that have a probe. */
export async function channelsWithProbe(executor: Executor, aircraftId: number): Promise<Set<number>> {
  const rows = await executor
    .select({ channelId: probes.channelId })
    .from(probes)
    .where(eq(probes.aircraftId, aircraftId))
  return new Set(rows.map((row) => row.channelId))
}

export async function insertProbe(
  tx: Transaction,
  aircraftId: number,
  channelId: number,
  values: LoggedProbe,
): Promise<void> {
  await tx.insert(probes).values({ ...values, aircraftId, channelId, loggedAt: new Date() })
}

export async function updateProbe(
  tx: Transaction,
  aircraftId: number,
  probe: Pick<Probe, 'id' | 'version'>,
  values: ProbeValues,
): Promise<void> {
  await tx
    .update(probes)
    .set({ ...values, loggedAt: new Date(), version: probe.version + 1 })
    .where(and(eq(probes.aircraftId, aircraftId), eq(probes.id, probe.id)))
}

export async function deleteProbe(tx: Transaction, aircraftId: number, probeId: number): Promise<void> {
  await tx.delete(probes).where(and(eq(probes.aircraftId, aircraftId), eq(probes.id, probeId)))
}
