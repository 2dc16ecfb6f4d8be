import { describe, expect, it } from 'vitest'
import {
  installedMatchesLock,
  lockFingerprint,
  requireNode,
} from '../../../scripts/lib/setup/node-modules.mjs'

describe('the fingerprint of the lock', () => {
  it('is the same for the same lock', () => {
    expect(lockFingerprint('{"a":1}', 'linux-x64')).toBe(lockFingerprint(Buffer.from('{"a":1}'), 'linux-x64'))
  })

  it('changes with the lock and with the machine', () => {
    const base = lockFingerprint('{"a":1}', 'linux-x64')
    expect(lockFingerprint('{"a":2}', 'linux-x64')).not.toBe(base)
    expect(lockFingerprint('{"a":1}', 'linux-arm64')).not.toBe(base)
  })
})

describe('whether the packages at hand match the lock', () => {
  const vue = { version: '3.5.0', integrity: 'sha512-v' }
  const lock = {
    packages: {
      '': { version: '0.1.0' },
      'node_modules/vue': vue,
      'node_modules/fsevents': { version: '2.3.3', integrity: 'sha512-f', optional: true },
    },
  }

  it('they do when all that is not optional is there', () => {
    expect(installedMatchesLock(lock, { packages: { 'node_modules/vue': vue } })).toBe(true)
  })

  it.each([
    ['nothing is installed', {}],
    ['another version is installed', { 'node_modules/vue': { ...vue, version: '3.4.0' } }],
    ['other content is installed', { 'node_modules/vue': { ...vue, integrity: 'sha512-x' } }],
    ['something is installed that is not locked', { 'node_modules/vue': vue, 'node_modules/x': vue }],
    ['one is missing', { 'node_modules/fsevents': { version: '2.3.3', integrity: 'sha512-f' } }],
  ])('they do not when %s', (_, packages) => {
    expect(installedMatchesLock(lock, { packages })).toBe(false)
  })
})

describe('the version of Node', () => {
  it.each(['20.19.0', '20.20.2', '22.1.0'])('%s will do', (version) => {
    expect(() => requireNode(version)).not.toThrow()
  })

  it.each(['18.20.4', '20.18.3'])('%s is too old', (version) => {
    expect(() => requireNode(version)).toThrow(`Node ${version} is too old.`)
  })
})
