import { spawn } from 'node:child_process'
import { mkdtemp, mkdir, readFile, rename, rm, stat, utimes, writeFile } from 'node:fs/promises'
import os from 'node:os'
import path from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { fingerprint } from '../../../scripts/lib/app/fingerprint.mjs'
import { birthOf } from '../../../scripts/lib/process-table.mjs'
import { requireFreeSpace } from '../../../scripts/lib/setup/disk.mjs'
import { lockHolder, takeLock } from '../../../scripts/lib/setup/instance-lock.mjs'
import { loadSecrets } from '../../../scripts/lib/setup/secrets.mjs'
import { tearDown } from '../../../scripts/lib/teardown.mjs'

let folder = ''
const file = (...names: string[]) => path.join(folder, ...names)

beforeEach(async () => {
  folder = await mkdtemp(path.join(os.tmpdir(), 'cowlbook-scripts-'))
})
afterEach(() => rm(folder, { recursive: true, force: true }))

describe('the fingerprint of the sources', () => {
  beforeEach(async () => {
    await mkdir(file('app', 'deep'), { recursive: true })
    await writeFile(file('app', 'a.ts'), 'one')
    await writeFile(file('app', 'deep', 'b.ts'), 'two')
  })
  const now = (facts: string[] = []) => fingerprint(folder, ['app', 'absent', 'single.ts'], facts)

  it('does not depend on dates', async () => {
    const before = await now()
    await utimes(file('app', 'a.ts'), 0, 0)
    expect(await now()).toBe(before)
  })

  it.each([
    ['content', () => writeFile(file('app', 'deep', 'b.ts'), 'three')],
    ['names', () => rename(file('app', 'a.ts'), file('app', 'c.ts'))],
    ['new files', () => writeFile(file('single.ts'), '')],
    ['lost files', () => rm(file('app', 'a.ts'))],
  ])('depends on %s', async (_, change) => {
    const before = await now()
    await change()
    expect(await now()).not.toBe(before)
  })

  it('depends on the facts given with it', async () => {
    expect(await now(['20.1'])).not.toBe(await now(['20.2']))
  })
})

describe('the secrets file', () => {
  it('is made once, for its owner only', async () => {
    const first = await loadSecrets(file('secrets.json'))
    const second = await loadSecrets(file('secrets.json'))
    expect(second).toEqual(first)
    expect((await stat(file('secrets.json'))).mode & 0o777).toBe(0o600)
  })

  it('is not overwritten when it cannot be read', async () => {
    await writeFile(file('secrets.json'), '{oops')
    await expect(loadSecrets(file('secrets.json'))).rejects.toThrow(/cannot be read as JSON/)
    expect(await readFile(file('secrets.json'), 'utf8')).toBe('{oops')
  })
})

describe('the lock on a data folder', () => {
  const lock = () => file('data', 'start.lock')
  const write = async (holder: object) => {
    await mkdir(file('data'))
    await writeFile(lock(), JSON.stringify(holder))
  }

  it('keeps a second start out while the first runs', async () => {
    const other = spawn('sleep', ['30'])
    try {
      await write({ pid: other.pid, birth: birthOf(Number(other.pid)), command: 'npm start' })
      await expect(takeLock(lock(), 'npm run dev')).rejects.toThrow(
        `"npm start" is already running on this data folder (process ${other.pid}).`,
      )
    } finally {
      other.kill()
    }
  })

  it('is taken over from a process that is gone, even when its number is in use again', async () => {
    await write({ pid: process.pid, birth: '1', command: 'npm start' })
    await takeLock(lock(), 'npm start')
    expect(await lockHolder(lock())).toMatchObject({ pid: process.pid, birth: birthOf(process.pid) })
  })

  it('is given back on the way out', async () => {
    await takeLock(lock(), 'npm start')
    await tearDown()
    expect(await lockHolder(lock())).toBeUndefined()
  })
})

describe('free space', () => {
  it('is enough for a little', async () => {
    await expect(requireFreeSpace(folder, 1, 'a note')).resolves.toBeUndefined()
  })

  it('is asked for in plain words when it is not enough', async () => {
    await expect(requireFreeSpace(folder, 1e9, 'the build')).rejects.toThrow(
      /^The disk is nearly full: \d+ MB are free, 1000000000 MB are needed for the build\.$/,
    )
  })
})
