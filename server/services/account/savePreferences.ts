import type { Preferences } from '#shared/schemas/account'
import type { Account } from '#shared/types/account'
import { accountChain, appendAuditEvent } from '~~/server/audit'
import { inTransaction } from '~~/server/db/client'
import { AppError } from '~~/server/http/appError'
import { lockAccount, updatePreferences } from '~~/server/repositories/accounts'

/** Stores the units a person wants to read. */
export async function savePreferences({ id }: Account, preferences: Preferences): Promise<Account> {
  return await inTransaction(async (tx) => {
    const stored = await lockAccount(tx, id)
    if (!stored) throw new AppError('unauthenticated', 'This account is no longer there.')
    await updatePreferences(tx, id, preferences)
    await appendAuditEvent(tx, {
      chain: accountChain(id),
      actorId: id,
      action: 'account.preferences-changed',
      entityId: id,
      before: { preferences: stored.account.preferences },
      after: { preferences },
    })
    return { ...stored.account, preferences }
  })
}
