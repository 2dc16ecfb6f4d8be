import { inject } from 'vitest'

export interface Answer<Body> {
  status: number
  body: Body
}

type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE'

/** A person's browser, as far as the API sees it: it keeps the cookie and speaks JSON. */
export class Client {
  private cookie = ''

  async send<Body>(method: Method, path: string, json?: unknown): Promise<Answer<Body>> {
    const response = await fetch(inject('baseUrl') + path, {
      method,
      headers: {
        cookie: this.cookie,
        origin: inject('baseUrl'),
        ...(json === undefined ? {} : { 'content-type': 'application/json' }),
      },
      body: json === undefined ? undefined : JSON.stringify(json),
    })
    this.keepCookies(response.headers.getSetCookie())
    const text = await response.text()
    return { status: response.status, body: (text === '' ? null : JSON.parse(text)) as Body }
  }

  get<Body>(path: string) {
    return this.send<Body>('GET', path)
  }

  /** The body of an answer that has to be right; anything else ends the test with what was refused. */
  async must<Body>(method: Method, path: string, json?: unknown): Promise<Body> {
    const { status, body } = await this.send<Body>(method, path, json)
    if (status >= 400) throw new Error(`${method} ${path}: ${status} ${JSON.stringify(body)}`)
    return body
  }

  private keepCookies(setCookies: readonly string[]): void {
    const pairs = setCookies.map((line) => line.split(';', 1)[0] ?? '')
    if (pairs.length > 0) this.cookie = pairs.join('; ')
  }
}

let registered = 0

/** A new account, signed in. */
export async function signUp(displayName = 'Test builder'): Promise<Client> {
  registered += 1
  const client = new Client()
  await client.must('POST', '/api/auth/register', {
    email: `person-${registered}-${Date.now()}@test.cowlbook.invalid`,
    displayName,
    password: 'a password for tests',
  })
  return client
}
