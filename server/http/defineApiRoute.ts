import type { EventHandler, H3Event } from 'h3'
import { defineEventHandler, getQuery, getRouterParams, setResponseHeader, setResponseStatus } from 'h3'
import { z } from 'zod'
import type { RouteAccess, RouteKey } from '#shared/domain/permissions'
import { ROUTES } from '#shared/domain/permissions'
import { idSchema } from '#shared/schemas/numbers'
import type { Admission } from './access'
import { admit } from './access'
import { requireOwnOrigin } from './origin'
import { parseWith } from './parse'
import { readJson } from './readJson'
import { sendProblem } from './sendProblem'

/** The ids in a route's path, by name: `:zoneId` becomes `zoneId`. */
type PathIds<Key extends string> = Key extends `${string}:${infer Name}/${infer Rest}`
  ? Record<Name, number> & PathIds<Rest>
  : Key extends `${string}:${infer Name}`
    ? Record<Name, number>
    : object

interface RouteInput<Key extends RouteKey, Query, Body> {
  event: H3Event
  /** Every id of the path. */
  params: PathIds<Key>
  query: Query
  body: Body
}

export type RouteContext<Key extends RouteKey, Query = undefined, Body = undefined> = Admission<Key> &
  RouteInput<Key, Query, Body>

interface RouteDefinition<Key extends RouteKey, Query extends z.ZodTypeAny, Body extends z.ZodTypeAny> {
  query?: Query
  body?: Body
  /** Status of a success: 200 unless given; an answer of nothing is 204. */
  status?: number
  handler(context: RouteContext<Key, z.output<Query>, z.output<Body>>): Promise<unknown>
}

/**
 * The one wrapper of every API handler. What the route demands is read from the table of routes, so a handler that
 * has no row there does not compile; then the request is read by its schemas, and whatever is thrown becomes a
 * problem. Nobody's rights are learnt from the validation of a body: access is decided first.
 */
export function defineApiRoute<
  Key extends RouteKey,
  Query extends z.ZodTypeAny = z.ZodUndefined,
  Body extends z.ZodTypeAny = z.ZodUndefined,
>(key: Key, route: RouteDefinition<Key, Query, Body>): EventHandler {
  const access: RouteAccess = ROUTES[key]
  const pathSchema = z.object(
    Object.fromEntries([...key.matchAll(/:(\w+)/g)].map(([, name]) => [String(name), idSchema])),
  )
  return defineEventHandler(async (event) => {
    try {
      setResponseHeader(event, 'cache-control', 'no-store')
      requireOwnOrigin(event)
      const params = parseWith(pathSchema, getRouterParams(event), 400)
      const admission = await admit(event, access, params.aircraftId)
      const query: unknown = route.query && parseWith(route.query, getQuery(event))
      const body: unknown = route.body && parseWith(route.body, await readJson(event))
      // The pieces were read by the very schemas the type is made of, which the compiler cannot follow.
      const context = { ...admission, event, params, query, body } as unknown as RouteContext<
        Key,
        z.output<Query>,
        z.output<Body>
      >
      return send(event, await route.handler(context), route.status)
    } catch (error) {
      return sendProblem(event, error)
    }
  })
}

function send(event: H3Event, answer: unknown, status = 200): unknown {
  setResponseStatus(event, answer === undefined ? 204 : status)
  return answer === undefined ? null : answer
}
