import { eq } from 'drizzle-orm'
import { beforeEach, describe, expect, it } from 'vitest'
import { database, inTransaction } from '~~/server/db/client'
import { auditChains, auditEvents, displays, users, zones } from '~~/server/db/schema'
import { asOwner, useTestDatabase } from '../support/database'
import { createWorkbook } from '../../factories/workbook'
import { resetDatabase } from '../support/reset'

useTestDatabase()
beforeEach(() => resetDatabase())

const HASH = '0'.repeat(64)
const chain = (name: string) => ({ chain: name, sequence: 0, hash: HASH })

describe('what is stored comes back as it was', () => {
  it('decimals as numbers, to their last digit', async () => {
    const { display } = await createWorkbook()
    const values = {
      gainErrorFraction: -0.123457,
      offsetKelvin: 0.001,
      lowCelsius: -273.15,
      highCelsius: 2999.999,
    }
    await database().update(displays).set(values).where(eq(displays.id, display.id))
    const [row] = await database().select().from(displays).where(eq(displays.id, display.id))
    expect(row).toMatchObject(values)
  })

  it('instants in UTC, to the millisecond, whatever the zone of the server', async () => {
    const at = new Date('2026-07-01T12:34:56.789Z')
    await database()
      .insert(users)
      .values({ email: 'a@example.org', displayName: 'A', passwordHash: 'x', createdAt: at })
    const [row] = await database().select().from(users)
    expect(row?.createdAt).toEqual(at)
    const [rows] = await asOwner((owner) => owner.query('SELECT CAST(created_at AS CHAR) AS text FROM users'))
    expect(rows).toEqual([{ text: '2026-07-01 12:34:56.789' }])
  })

  it('JSON parsed, with nothing for null', async () => {
    const event = {
      chain: 'account:1',
      at: new Date(),
      action: 'x',
      entity: 'y',
      previousHash: HASH,
      hash: HASH,
    }
    const after = { text: 'ä\u{1F525}', list: [1, null, { deep: true }], number: 0.1 }
    await database()
      .insert(auditEvents)
      .values({ ...event, sequence: 1, after })
    const [row] = await database().select().from(auditEvents)
    expect(row?.after).toEqual(after)
    expect(row?.before).toBeNull()
  })

  it('the time of the last write moves by itself', async () => {
    await createWorkbook()
    const [before] = await database().select().from(zones)
    await new Promise((resolve) => setTimeout(resolve, 5))
    await database()
      .update(zones)
      .set({ name: 'Renamed' })
      .where(eq(zones.id, before?.id ?? 0))
    const [after] = await database()
      .select()
      .from(zones)
      .where(eq(zones.id, before?.id ?? 0))
    expect(after?.updatedAt.getTime()).toBeGreaterThan(before?.updatedAt.getTime() ?? Infinity)
    expect(after?.createdAt).toEqual(before?.createdAt)
  })
})

describe('a transaction', () => {
  it('stores all of its work or nothing', async () => {
    const work = inTransaction(async (tx) => {
      await tx.insert(auditChains).values(chain('account:1'))
      throw new Error('the second half fails')
    })
    await expect(work).rejects.toThrow('the second half fails')
    expect(await database().select().from(auditChains)).toEqual([])
  })

  it('is done again when it and another waited for each other', async () => {
    await database()
      .insert(auditChains)
      .values([chain('account:1'), chain('account:2')])
    let runs = 0
    let holders = 0
    const bothHoldOne = new Promise<void>((resolve) => {
      const look = setInterval(() => {
        if (holders < 2) return
        clearInterval(look)
        resolve()
      }, 5)
    })
    const lockBoth = (one: string, other: string) =>
      inTransaction(async (tx) => {
        runs += 1
        await tx.update(auditChains).set({ sequence: runs }).where(eq(auditChains.chain, one))
        holders += 1
        await bothHoldOne
        await tx.update(auditChains).set({ sequence: runs }).where(eq(auditChains.chain, other))
      })
    await Promise.all([lockBoth('account:1', 'account:2'), lockBoth('account:2', 'account:1')])
    expect(runs).toBe(3)
  })

  it('gives other errors on at once', async () => {
    let runs = 0
    const work = inTransaction(async (tx) => {
      runs += 1
      await tx.insert(auditChains).values([chain('account:1'), chain('account:1')])
    })
    await expect(work).rejects.toMatchObject({ cause: { errno: 1062 } })
    expect(runs).toBe(1)
  })
})
