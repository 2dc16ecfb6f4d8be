import net from 'node:net'
import { afterEach, describe, expect, it } from 'vitest'
import {
  browserAddress,
  choosePort,
  isPortFree,
  requireFreePort,
  servingAddress,
} from '../../../scripts/lib/ports.mjs'

const servers: net.Server[] = []

/** Listens on a port the system chooses. */
async function occupy(): Promise<number> {
  const server = net.createServer()
  servers.push(server)
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
  const address = server.address()
  if (address === null || typeof address === 'string') throw new Error('no port')
  return address.port
}

afterEach(async () => {
  await Promise.all(servers.splice(0).map((server) => new Promise((resolve) => server.close(resolve))))
})

describe('choosing a port for the database', () => {
  it('takes the remembered one when it is free', async () => {
    expect(await choosePort({ remembered: 23_456, isFree: async () => true })).toBe(23_456)
  })

  it('takes another when the remembered one is in use', async () => {
    const isFree = async (port: number) => port !== 23_456
    expect(await choosePort({ remembered: 23_456, isFree, random: () => 0 })).toBe(20_000)
  })

  it('stays within its range', async () => {
    const isFree = async () => true
    expect(await choosePort({ isFree, random: () => 0 })).toBe(20_000)
    expect(await choosePort({ isFree, random: () => 0.999_999 })).toBe(29_999)
  })

  it('tries until one is free', async () => {
    const candidates = [0, 0.1, 0.2]
    const isFree = async (port: number) => port === 22_000
    expect(await choosePort({ isFree, random: () => candidates.shift() ?? 0 })).toBe(22_000)
  })

  it('gives up with a message when none is free', async () => {
    await expect(choosePort({ isFree: async () => false })).rejects.toThrow(/No free port/)
  })
})

describe('whether a port is free', () => {
  it('sees a listener, and sees it gone', async () => {
    const port = await occupy()
    expect(await isPortFree(port)).toBe(false)
    const server = servers.pop()
    await new Promise((resolve) => server?.close(resolve))
    expect(await isPortFree(port)).toBe(true)
  })

  it('refuses to serve on a port in use, and says where else', async () => {
    const port = await occupy()
    await expect(requireFreePort({ host: '127.0.0.1', port })).rejects.toMatchObject({
      message: `Port ${port} on 127.0.0.1 is in use.`,
      todo: expect.stringContaining(`PORT=${port + 1} npm start`),
    })
  })

  it('says so when the host is no address of this machine', async () => {
    const refused = requireFreePort({ host: '192.0.2.1', port: 30_111 })
    await expect(refused).rejects.toThrow(/Cannot listen on 192\.0\.2\.1/)
  })
})

describe('the address to serve on', () => {
  it('is loopback, port 3000, unless the surroundings say otherwise', () => {
    expect(servingAddress({})).toEqual({ host: '127.0.0.1', port: 3000 })
    expect(servingAddress({ HOST: '', PORT: ' ' })).toEqual({ host: '127.0.0.1', port: 3000 })
    expect(servingAddress({ HOST: '::1', PORT: '8080' })).toEqual({ host: '::1', port: 8080 })
  })

  it.each(['abc', '0', '-1', '65536', '80.5', '3000x'])('refuses PORT=%s', (PORT) => {
    expect(() => servingAddress({ PORT })).toThrow(/not a port number/)
  })

  it.each([
    ['127.0.0.1', 'http://127.0.0.1:3000'],
    ['0.0.0.0', 'http://127.0.0.1:3000'],
    ['::1', 'http://[::1]:3000'],
    ['hangar.example.org', 'http://hangar.example.org:3000'],
  ])('is written for %s as %s', (host, written) => {
    expect(browserAddress({ host, port: 3000 })).toBe(written)
  })
})
