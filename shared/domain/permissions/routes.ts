import type { Permission } from './matrix'

/** What a route demands: nothing, a session, or a permission on the aircraft named in its path. */
export type RouteAccess = 'public' | 'signed-in' | Permission

/** Every API route of the product and what it demands. A route without a row here does not answer. */
export const ROUTES = {
  'GET /api/health': 'public',
  'GET /api/bench/thermocouple': 'public',
  'POST /api/bench/run': 'public',

  'POST /api/auth/register': 'public',
  'POST /api/auth/sign-in': 'public',
  'POST /api/auth/sign-out': 'public',
  'GET /api/account': 'signed-in',
  'POST /api/account/password': 'signed-in',
  'PATCH /api/account/preferences': 'signed-in',

  'GET /api/aircraft': 'signed-in',
  'POST /api/aircraft': 'signed-in',
  'GET /api/aircraft/:aircraftId': 'aircraft:see',
  'PATCH /api/aircraft/:aircraftId': 'aircraft:edit',
  'DELETE /api/aircraft/:aircraftId': 'aircraft:administer',
  'POST /api/aircraft/:aircraftId/archive': 'aircraft:administer',
  'POST /api/aircraft/:aircraftId/restore': 'aircraft:administer',
  'GET /api/aircraft/:aircraftId/people': 'aircraft:see',
  'GET /api/aircraft/:aircraftId/history': 'aircraft:see',

  'GET /api/aircraft/:aircraftId/zones': 'aircraft:see',
  'POST /api/aircraft/:aircraftId/zones': 'aircraft:edit',
  'PATCH /api/aircraft/:aircraftId/zones/:zoneId': 'aircraft:edit',
  'DELETE /api/aircraft/:aircraftId/zones/:zoneId': 'aircraft:edit',
  'POST /api/aircraft/:aircraftId/states': 'aircraft:edit',
  'PATCH /api/aircraft/:aircraftId/states/:stateId': 'aircraft:edit',
  'DELETE /api/aircraft/:aircraftId/states/:stateId': 'aircraft:edit',
  'PUT /api/aircraft/:aircraftId/states/:stateId/temperatures/:zoneId': 'aircraft:edit',

  'GET /api/aircraft/:aircraftId/displays': 'aircraft:see',
  'POST /api/aircraft/:aircraftId/displays': 'aircraft:edit',
  'PATCH /api/aircraft/:aircraftId/displays/:displayId': 'aircraft:edit',
  'DELETE /api/aircraft/:aircraftId/displays/:displayId': 'aircraft:edit',

  'GET /api/aircraft/:aircraftId/channels': 'aircraft:see',
  'POST /api/aircraft/:aircraftId/channels': 'aircraft:edit',
  'GET /api/aircraft/:aircraftId/channels/:channelId': 'aircraft:see',
  'PATCH /api/aircraft/:aircraftId/channels/:channelId': 'aircraft:edit',
  'DELETE /api/aircraft/:aircraftId/channels/:channelId': 'aircraft:edit',
  'PUT /api/aircraft/:aircraftId/channels/:channelId/probe': 'work:log',
  'DELETE /api/aircraft/:aircraftId/channels/:channelId/probe': 'work:log',
  'PUT /api/aircraft/:aircraftId/channels/:channelId/run': 'work:log',
  'DELETE /api/aircraft/:aircraftId/channels/:channelId/run': 'work:log',
} as const satisfies Record<string, RouteAccess>

export type RouteKey = keyof typeof ROUTES
