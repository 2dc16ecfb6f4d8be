import type { H3Event } from 'h3'
import { getRequestHeader, readRawBody, setResponseHeader } from 'h3'
import { AppError } from './appError'

/** The largest body the API has a use for is a run of 16 sections in 24 operating states, well under 100 kB. */
const LIMIT_BYTES = 256 * 1024

/** Reads a JSON body without ever holding more than the limit of it. */
export async function readJson(event: H3Event): Promise<unknown> {
  const type = getRequestHeader(event, 'content-type') ?? ''
  if (!/^application\/json\s*(;|$)/i.test(type)) {
    throw new AppError('invalid-input', 'Send the body as application/json.', { status: 415 })
  }
  const text = await readLimited(event)
  try {
    return JSON.parse(text, wellFormed)
  } catch (cause) {
    throw new AppError('invalid-input', 'The body is not valid JSON.', { status: 400, cause })
  }
}

/** Half of a surrogate pair is valid JSON but no text, and the database would refuse it late or store another. */
function wellFormed(_key: string, value: unknown): unknown {
  if (typeof value === 'string' && !value.isWellFormed()) throw new SyntaxError('A text is not well-formed.')
  return value
}

async function readLimited(event: H3Event): Promise<string> {
  if (Number(getRequestHeader(event, 'content-length') ?? 0) > LIMIT_BYTES) throw tooLarge(event)
  // A page rendered on the server calls the API without a socket; its body is there already.
  if ('body' in event.node.req) return (await readRawBody(event)) ?? ''
  return await collect(event)
}

/** Counts what arrives: a body sent in chunks declares no length beforehand. */
function collect(event: H3Event): Promise<string> {
  const { req } = event.node
  return new Promise((resolve, reject) => {
    const chunks: Buffer[] = []
    let bytes = 0
    req.on('data', (chunk: Buffer) => {
      bytes += chunk.length
      if (bytes > LIMIT_BYTES) {
        chunks.length = 0
        reject(tooLarge(event))
      } else chunks.push(chunk)
    })
    req.on('end', () => resolve(Buffer.concat(chunks).toString('utf8')))
    req.on('error', reject)
    req.on('close', () => reject(new AppError('invalid-input', 'The body broke off.', { status: 400 })))
  })
}

function tooLarge(event: H3Event): AppError {
  // The rest of the body is of no interest; closing spares both sides its transfer.
  setResponseHeader(event, 'connection', 'close')
  return new AppError('invalid-input', `The body is larger than ${LIMIT_BYTES / 1024} kB.`, { status: 413 })
}
