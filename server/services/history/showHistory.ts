import type { PageQuery } from '#shared/schemas/paging'
import type { HistoryEvent, Page } from '#shared/types/workbook'
import { aircraftChain } from '~~/server/audit'
import { inTransaction } from '~~/server/db/client'
import { listHistory } from '~~/server/repositories/auditEvents'

/** What happened to an aircraft, newest first. */
export function showHistory(aircraftId: number, { page, pageSize }: PageQuery): Promise<Page<HistoryEvent>> {
  return inTransaction(async (tx) => ({
    ...(await listHistory(tx, aircraftChain(aircraftId), { page, pageSize })),
    page,
    pageSize,
  }))
}
