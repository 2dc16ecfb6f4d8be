import net from 'node:net'
import { Failure } from './failure.mjs'

// Below the range from which Linux takes ports for outgoing connections, so that a remembered port stays free.
const FIRST_PORT = 20_000
const LAST_PORT = 29_999
const ATTEMPTS = 200

/**
 * @param {number} port
 * @param {string} [host]
 * @returns {Promise<boolean>}
 */
export function isPortFree(port, host = '127.0.0.1') {
  return new Promise((resolve, reject) => {
    const probe = net.createServer()
    probe.once('error', (/** @type {NodeJS.ErrnoException} */ error) => {
      if (error.code === 'EADDRINUSE') resolve(false)
      else reject(error)
    })
    probe.listen({ port, host, exclusive: true }, () => probe.close(() => resolve(true)))
  })
}

/**
 * A port for the private database: the one used last time when it is still free, else another.
 * @param {{ remembered?: number, isFree?: (port: number) => Promise<boolean>, random?: () => number }} [options]
 * @returns {Promise<number>}
 */
export async function choosePort({ remembered, isFree = isPortFree, random = Math.random } = {}) {
  if (remembered !== undefined && (await isFree(remembered))) return remembered
  for (let attempt = 0; attempt < ATTEMPTS; attempt += 1) {
    const candidate = FIRST_PORT + Math.floor(random() * (LAST_PORT - FIRST_PORT + 1))
    if (await isFree(candidate)) return candidate
  }
  throw new Failure(`No free port was found between ${FIRST_PORT} and ${LAST_PORT} on 127.0.0.1.`, {
    todo: 'See what holds them with: ss -ltn',
  })
}

/**
 * The address to serve on, from the environment.
 * @param {NodeJS.ProcessEnv} environment
 * @returns {{ host: string, port: number }}
 */
export function servingAddress(environment) {
  const host = environment.HOST?.trim() || '127.0.0.1'
  const written = environment.PORT?.trim() || '3000'
  const port = Number(written)
  if (!Number.isInteger(port) || port < 1 || port > 65_535) {
    throw new Failure(`PORT is "${written}", which is not a port number.`, {
      todo: 'Set PORT to a whole number from 1 to 65535, or leave it out for 3000.',
    })
  }
  return { host, port }
}

/** Refuses when somebody else listens there. @param {{ host: string, port: number }} address */
export async function requireFreePort({ host, port }) {
  const advice =
    `Stop what uses it (ss -ltnp 'sport = :${port}' names it), ` +
    `or serve elsewhere: PORT=${port === 65_535 ? port - 1 : port + 1} npm start`
  const free = await isPortFree(port, host).catch((/** @type {NodeJS.ErrnoException} */ error) => {
    throw new Failure(`Cannot listen on ${host}, port ${port}: ${error.message}.`, {
      todo: 'Check HOST and PORT: HOST must be an address of this machine, ports below 1024 need root.',
    })
  })
  if (!free) throw new Failure(`Port ${port} on ${host} is in use.`, { todo: advice })
}

/** The address as a browser on this machine writes it. @param {{ host: string, port: number }} address */
export function browserAddress({ host, port }) {
  const everywhere = host === '0.0.0.0' || host === '::'
  const name = everywhere ? '127.0.0.1' : host.includes(':') ? `[${host}]` : host
  return `http://${name}:${port}`
}
