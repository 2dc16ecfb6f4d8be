import { FetchError } from 'ofetch'
import type { Problem } from '#shared/types/problem'

/** A refusal of the API, with the problem it sent. */
export class ApiFailure extends Error {
  constructor(readonly problem: Problem) {
    super(problem.detail)
    this.name = 'ApiFailure'
  }
}

const UNREACHABLE: Problem = {
  type: 'about:blank',
  title: 'No connection',
  status: 0,
  detail: 'The server could not be reached. Nothing was lost: check the connection and try again.',
  code: 'unavailable',
}

function isProblem(data: unknown): data is Problem {
  return typeof data === 'object' && data !== null && 'code' in data && 'detail' in data
}

/** The problem behind anything thrown by a call. */
export function problemOf(error: unknown): Problem {
  if (error instanceof ApiFailure) return error.problem
  if (error instanceof FetchError) return isProblem(error.data) ? error.data : UNREACHABLE
  throw error
}

type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE'

/** Typed calls to our JSON API. On the server the visitor's cookies go along. */
export function useApi() {
  const fetcher = useRequestFetch()

  async function call<Answer>(method: Method, path: string, body?: object): Promise<Answer> {
    try {
      return (await fetcher(path, { method, body })) as Answer
    } catch (error) {
      throw new ApiFailure(problemOf(error))
    }
  }

  return {
    get: <Answer>(path: string) => call<Answer>('GET', path),
    post: <Answer>(path: string, body: object) => call<Answer>('POST', path, body),
    put: <Answer>(path: string, body: object) => call<Answer>('PUT', path, body),
    patch: <Answer>(path: string, body: object) => call<Answer>('PATCH', path, body),
    remove: (path: string) => call<undefined>('DELETE', path),
  }
}
