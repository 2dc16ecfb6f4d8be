import { asc, eq, inArray } from 'drizzle-orm'
import type { WiringRunInput } from '#shared/schemas/run'
import type { Executor, Transaction } from '~~/server/db/client'
import { runJoints, runSections } from '~~/server/db/schema'

type Section = WiringRunInput['sections'][number]
type Joint = WiringRunInput['joints'][number]

export interface RunPartsOf {
  sections: Section[]
  joints: Joint[]
}

function toSection(row: typeof runSections.$inferSelect): Section {
  const { partId: id, label, positive, negative, lengthMetres, gaugeAwg } = row
  return { id, label, positive, negative, lengthMetres, gaugeAwg }
}

function toJoint(row: typeof runJoints.$inferSelect): Joint {
  const { label, kind, crossed, positiveMetal, negativeMetal } = row
  const { positiveOffsetKelvin, negativeOffsetKelvin } = row
  return {
    id: row.partId,
    label,
    kind,
    tipSideZone: String(row.tipSideZoneId),
    displaySideZone: String(row.displaySideZoneId),
    crossed,
    positiveMetal,
    negativeMetal,
    positiveOffsetKelvin,
    negativeOffsetKelvin,
  }
}

/** Sections and joints of several runs, tip to display, in two queries however many runs there are. */
export async function listRunParts(
  executor: Executor,
  runIds: readonly number[],
): Promise<Map<number, RunPartsOf>> {
  const parts = new Map(runIds.map((id): [number, RunPartsOf] => [id, { sections: [], joints: [] }]))
  if (runIds.length === 0) return parts
  const sections = await executor
    .select()
    .from(runSections)
    .where(inArray(runSections.runId, [...runIds]))
    .orderBy(asc(runSections.runId), asc(runSections.position))
  const joints = await executor
    .select()
    .from(runJoints)
    .where(inArray(runJoints.runId, [...runIds]))
    .orderBy(asc(runJoints.runId), asc(runJoints.position))
  for (const row of sections) parts.get(row.runId)?.sections.push(toSection(row))
  for (const row of joints) parts.get(row.runId)?.joints.push(toJoint(row))
  return parts
}

/** Stores the parts of a run that has none. */
export async function insertRunParts(
  tx: Transaction,
  runId: number,
  { sections, joints }: RunPartsOf,
): Promise<void> {
  await tx
    .insert(runSections)
    .values(sections.map(({ id, ...section }, position) => ({ ...section, runId, position, partId: id })))
  if (joints.length === 0) return
  await tx.insert(runJoints).values(
    joints.map(({ id, tipSideZone, displaySideZone, ...joint }, position) => ({
      ...joint,
      runId,
      position,
      partId: id,
      tipSideZoneId: Number(tipSideZone),
      displaySideZoneId: Number(displaySideZone),
    })),
  )
}

export async function deleteRunParts(tx: Transaction, runId: number): Promise<void> {
  await tx.delete(runSections).where(eq(runSections.runId, runId))
  await tx.delete(runJoints).where(eq(runJoints.runId, runId))
}
