import type { Role } from '#shared/domain/permissions'
import type { Account } from '#shared/types/account'
import { hashPassword } from '~~/server/auth/passwords'
import type { Transaction } from '~~/server/db/client'
import { storeAccount } from '~~/server/services/account/register'
import type { DemoPerson } from './data/people'
import { DEMO_PASSWORD, DEMO_PEOPLE } from './data/people'

/** Who plays which role. */
export type DemoCast = Readonly<Record<Role, Account>>

async function storePerson(tx: Transaction, { email, displayName }: DemoPerson): Promise<Account> {
  const passwordHash = await hashPassword(DEMO_PASSWORD)
  const { account } = await storeAccount(tx, { email, displayName, passwordHash })
  return account
}

/** Makes an account for each role. */
export async function storePeople(tx: Transaction): Promise<DemoCast> {
  return {
    owner: await storePerson(tx, DEMO_PEOPLE.owner),
    builder: await storePerson(tx, DEMO_PEOPLE.builder),
    inspector: await storePerson(tx, DEMO_PEOPLE.inspector),
    mentor: await storePerson(tx, DEMO_PEOPLE.mentor),
  }
}
