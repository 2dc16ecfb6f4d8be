import type { Connection } from 'mysql2/promise'
import { beforeEach, describe, expect, it } from 'vitest'
import type { AuditChain } from '~~/server/audit'
import { appendAuditEvent, verifyAuditChain } from '~~/server/audit'
import { database, inTransaction } from '~~/server/db/client'
import { asOwner, useTestDatabase } from '../support/database'
import { resetDatabase } from '../support/reset'

useTestDatabase()
beforeEach(() => resetDatabase())

const CHAIN: AuditChain = 'aircraft:7'

const append = (after: object, chain: AuditChain = CHAIN) =>
  inTransaction((tx) =>
    appendAuditEvent(tx, { chain, actorId: 3, action: 'zone.updated', entityId: 9, before: null, after }),
  )
const verify = (chain: AuditChain = CHAIN) => verifyAuditChain(database(), chain)

/** What somebody could do who holds the owner's password: the triggers do not stop a TRUNCATE and a new INSERT. */
async function tamper(change: string): Promise<void> {
  await asOwner(async (owner: Connection) => {
    await owner.query('CREATE TEMPORARY TABLE forged AS SELECT * FROM audit_events')
    await owner.query(change)
    await owner.query('TRUNCATE audit_events')
    await owner.query('INSERT INTO audit_events SELECT * FROM forged')
  })
}

describe('a chain', () => {
  it('is intact as long as it is written by us', async () => {
    for (let i = 1; i <= 4; i++)
      await append({ version: i, name: 'Bay', celsius: 0.1 + 0.2, nested: { b: 1, a: [] } })
    await append({ version: 1 }, 'account:7')
    expect(await verify()).toEqual({ intact: true, events: 4 })
    expect(await verify('account:7')).toEqual({ intact: true, events: 1 })
  })

  it('without events is intact', async () => {
    expect(await verify()).toEqual({ intact: true, events: 0 })
  })

  it('keeps its order when many write at once, the first event included', async () => {
    await Promise.all(Array.from({ length: 12 }, (_, i) => append({ version: i })))
    expect(await verify()).toEqual({ intact: true, events: 12 })
  })

  it('has room for every text', async () => {
    await append({
      name: 'Zündkerze \u{1F525} "quoted" \\ \u2028 \u0000',
      empty: '',
      none: null,
      gone: undefined,
    })
    expect(await verify()).toEqual({ intact: true, events: 1 })
  })
})

describe('what was tampered with is found', () => {
  beforeEach(async () => {
    for (let i = 1; i <= 3; i++) await append({ version: i })
  })

  it.each([
    ['a changed content', `UPDATE forged SET after = '{"version":5}' WHERE sequence = 2`, 2, 'content'],
    ['another actor', 'UPDATE forged SET actor_id = 4 WHERE sequence = 1', 1, 'content'],
    ['another time', 'UPDATE forged SET at = at - INTERVAL 1 SECOND WHERE sequence = 3', 3, 'content'],
    ['a missing event', 'DELETE FROM forged WHERE sequence = 2', 2, 'missing'],
    ['a missing start', 'DELETE FROM forged WHERE sequence = 1', 1, 'missing'],
    ['a missing end', 'DELETE FROM forged WHERE sequence = 3', 3, 'missing'],
    [
      'a moved event',
      'UPDATE forged SET sequence = 5 - sequence, id = id + 10 WHERE sequence > 1',
      2,
      'does not follow',
    ],
  ])('%s', async (_, change, sequence, reason) => {
    await tamper(change)
    expect(await verify()).toEqual({ intact: false, sequence, reason: expect.stringContaining(reason) })
  })
})

describe('an event', () => {
  it('is written with its write or not at all', async () => {
    const failing = inTransaction(async (tx) => {
      await appendAuditEvent(tx, {
        chain: CHAIN,
        actorId: 3,
        action: 'zone.created',
        entityId: 9,
        before: null,
        after: {},
      })
      throw new Error('the write fails')
    })
    await expect(failing).rejects.toThrow('the write fails')
    const [rows] = await asOwner((owner) => owner.query('SELECT * FROM audit_events'))
    expect(rows).toEqual([])
    expect(await verify()).toEqual({ intact: true, events: 0 })
  })

  it.each([
    ['altered', "UPDATE audit_events SET action = 'x'"],
    ['removed', 'DELETE FROM audit_events'],
  ])('is never %s, not even by the owner of the table', async (_, statement) => {
    await append({ version: 1 })
    await expect(asOwner((owner) => owner.query(statement))).rejects.toThrow('append-only')
    expect(await verify()).toEqual({ intact: true, events: 1 })
  })

  it.each([
    ["UPDATE audit_events SET action = 'x'"],
    ['DELETE FROM audit_events'],
    ['TRUNCATE audit_events'],
  ])('is out of reach of the application: %s', async (statement) => {
    await append({ version: 1 })
    await expect(database().execute(statement)).rejects.toMatchObject({
      cause: { message: expect.stringMatching(/denied|append-only/) },
    })
  })
})
