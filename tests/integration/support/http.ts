import { inject } from 'vitest'
import type { Account } from '#shared/types/account'
import type { Problem } from '#shared/types/problem'

export type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE'

export interface Request {
  json?: unknown
  /** Sent as it is, instead of `json`. */
  raw?: BodyInit
  headers?: Record<string, string>
  cookie?: string
}

export interface Answer<Body> {
  status: number
  headers: Headers
  body: Body
}

/** One bare request to the built server, for tests about what passes over the wire. */
export async function send<Body = Problem>(
  method: Method,
  path: string,
  { json, raw, headers = {}, cookie }: Request = {},
): Promise<Answer<Body>> {
  const init: RequestInit & { duplex?: 'half' } = {
    method,
    headers: {
      ...(json === undefined ? {} : { 'content-type': 'application/json' }),
      ...(cookie === undefined ? {} : { cookie }),
      ...headers,
    },
    body: json === undefined ? raw : JSON.stringify(json),
    duplex: 'half',
  }
  const response = await fetch(inject('baseUrl') + path, init)
  const text = await response.text()
  const isJson = /json/.test(response.headers.get('content-type') ?? '')
  return {
    status: response.status,
    headers: response.headers,
    body: (isJson && text !== '' ? JSON.parse(text) : text) as Body,
  }
}

/** The session an answer hands out, as a `cookie` header; undefined when it hands out none. */
export function sessionOf({ headers }: Pick<Answer<unknown>, 'headers'>): string | undefined {
  const line = headers.getSetCookie().find((cookie) => cookie.startsWith('cowlbook-session='))
  return line?.split(';', 1)[0]
}

export const PASSWORD = 'a password for tests'

export interface TestAccount {
  account: Account
  email: string
  cookie: string
}

let made = 0

/** A new account with a session. */
export async function makeAccount(displayName = 'Test person'): Promise<TestAccount> {
  made += 1
  const email = `account-${made}-${Date.now()}@test.cowlbook.invalid`
  const answer = await send<{ account: Account }>('POST', '/api/auth/register', {
    json: { email, displayName, password: PASSWORD },
  })
  const cookie = sessionOf(answer)
  if (answer.status !== 201 || !cookie) throw new Error(`No account: ${JSON.stringify(answer.body)}`)
  return { account: answer.body.account, email, cookie }
}
