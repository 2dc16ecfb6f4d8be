import { beforeEach, describe, expect, it } from 'vitest'
import { aircraftChain, appendAuditEvent, requireCurrentVersion } from '~~/server/audit'
import type { AuditAction, VersionedSubject } from '~~/server/audit'
import { database, inTransaction } from '~~/server/db/client'
import { useTestDatabase } from '../support/database'
import type { TestAccount } from '../support/http'
import { makeAccount } from '../support/http'
import { resetDatabase } from '../support/reset'

useTestDatabase()

const chain = aircraftChain(7)
const subject: VersionedSubject = { chain, entity: 'zone', entityId: 9, called: 'zone Engine bay' }
let writer: TestAccount

beforeEach(async () => {
  await resetDatabase()
  writer = await makeAccount('Wilma Writer')
})

const record = (before: object | null, after: object | null, action: AuditAction = 'zone.updated') =>
  inTransaction((tx) =>
    appendAuditEvent(tx, { chain, actorId: writer.account.id, action, entityId: 9, before, after }),
  )
const require = (basedOn: number | null, current: { version: number } | null, about = subject) =>
  requireCurrentVersion(database(), about, basedOn, current)

const first = { id: 9, version: 1, name: 'Engine bay', kind: 'engine-bay', parts: [{ a: 1, b: 2 }] }
const second = { ...first, version: 2, name: 'Bay', parts: [{ b: 2, a: 1 }] }
const third = { ...second, version: 3, kind: 'firewall' }

describe('a write', () => {
  it('goes through when it was based on what is stored', async () => {
    await expect(require(2, second)).resolves.toBeUndefined()
    await expect(require(null, null)).resolves.toBeUndefined()
  })

  it('is refused when it was not, with every field that has changed since, by whom and when', async () => {
    await record(null, first)
    await record(first, second)
    await record(second, third)
    await expect(require(1, third)).rejects.toMatchObject({
      code: 'stale-version',
      status: 409,
      message:
        'Wilma Writer has changed the zone Engine bay since you opened it. Nothing of yours was stored.',
      changed: {
        version: 3,
        fields: [
          { field: 'name', current: 'Bay' },
          { field: 'kind', current: 'firewall' },
        ],
        changedBy: 'Wilma Writer',
        changedAt: expect.stringMatching(/Z$/),
      },
    })
    await expect(require(2, third)).rejects.toMatchObject({
      changed: { fields: [{ field: 'kind', current: 'firewall' }] },
    })
  })

  it('is refused when the record has been removed, or has come into being, meanwhile', async () => {
    await record(null, first)
    await expect(require(null, first)).rejects.toMatchObject({
      changed: { version: 1, fields: expect.arrayContaining([{ field: 'name', current: 'Engine bay' }]) },
    })
    await record(first, null, 'zone.deleted')
    await expect(require(1, null)).rejects.toMatchObject({
      message: expect.stringContaining('has removed the zone Engine bay'),
      changed: { version: 0, fields: [] },
    })
  })

  it('is compared with its own record where several share a key', async () => {
    const at = (stateId: number, version: number, celsius: number) => ({
      stateId,
      zoneId: 9,
      version,
      celsius,
    })
    await record(null, at(1, 1, 20), 'temperature.set')
    await record(at(1, 1, 20), at(1, 2, 30), 'temperature.set')
    await record(at(2, 1, 400), at(2, 2, 500), 'temperature.set')
    const temperature: VersionedSubject = {
      ...subject,
      entity: 'temperature',
      distinguishedBy: { stateId: 1 },
    }
    await expect(require(1, at(1, 2, 30), temperature)).rejects.toMatchObject({
      changed: { fields: [{ field: 'celsius', current: 30 }] },
    })
  })

  it('says what it can when the audit does not tell', async () => {
    await expect(require(1, third)).rejects.toMatchObject({
      code: 'stale-version',
      changed: { version: 3, fields: [], changedBy: null, changedAt: null },
    })
  })
})
