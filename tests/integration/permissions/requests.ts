import type { RouteKey } from '#shared/domain/permissions'
import { aircraftInput, displayInput, probeInput, runInput, thermocoupleInput } from '../../factories/records'
import { PASSWORD } from '../support/http'

/** Records of the aircraft the requests are about. */
export interface Ids {
  aircraftId: number
  zoneId: number
  stateId: number
  displayId: number
  channelId: number
}

export interface Facts {
  ids: Ids
  /** E-mail address of whoever sends the request. */
  email: string
  /** Makes names that nobody has yet. */
  unique: () => string
}

/**
 * Far ahead of what is stored: a write that gets past the permission is answered with 409 and destroys nothing, so
 * that the next role finds everything as it was.
 */
const version = 999_999
const versionInQuery = { query: `?version=${version}` }

interface Sample {
  query?: string
  json?: unknown
}

const benchRun = {
  run: {
    type: 'K',
    tipZone: 'tip',
    sections: [{ id: 's1', label: 'Probe', positive: 'KP', negative: 'KN' }],
    joints: [],
    terminals: { zone: 'panel', crossed: false, positiveOffsetKelvin: 0, negativeOffsetKelvin: 0 },
    display: { typeSetting: 'K', compensation: { kind: 'none' } },
  },
  conditions: { zoneCelsius: { tip: 100, panel: 20 } },
}

const DISPLAYS = '/api/aircraft/:aircraftId/displays'
const CHANNEL = '/api/aircraft/:aircraftId/channels/:channelId'

/** For every route a request that is right in itself, so that only who sends it can be what is wrong with it. */
export const SAMPLES: Record<RouteKey, (facts: Facts) => Sample> = {
  'GET /api/health': () => ({}),
  'GET /api/bench/thermocouple': () => ({ query: '?type=K&celsius=300' }),
  'POST /api/bench/run': () => ({ json: benchRun }),

  'POST /api/auth/register': ({ unique }) => ({
    json: { email: `${unique()}@test.cowlbook.invalid`, displayName: 'New', password: PASSWORD },
  }),
  'POST /api/auth/sign-in': ({ email }) => ({ json: { email, password: PASSWORD } }),
  'POST /api/auth/sign-out': () => ({}),
  'GET /api/account': () => ({}),
  // Too short, and refused as such: the password itself stays what it is.
  'POST /api/account/password': () => ({ json: { currentPassword: PASSWORD, newPassword: 'short' } }),
  'PATCH /api/account/preferences': () => ({
    json: { temperatureUnit: 'celsius', lengthUnit: 'metre', gaugeUnit: 'awg' },
  }),

  'GET /api/aircraft': () => ({}),
  'POST /api/aircraft': () => ({ json: aircraftInput() }),
  'GET /api/aircraft/:aircraftId': () => ({}),
  'PATCH /api/aircraft/:aircraftId': () => ({
    json: { version, name: 'Renamed', registration: '', cableStandard: 'astm-e230' },
  }),
  'DELETE /api/aircraft/:aircraftId': () => versionInQuery,
  'POST /api/aircraft/:aircraftId/archive': () => ({ json: { version } }),
  'POST /api/aircraft/:aircraftId/restore': () => ({ json: { version } }),
  'GET /api/aircraft/:aircraftId/people': () => ({}),
  'GET /api/aircraft/:aircraftId/history': () => ({}),

  'GET /api/aircraft/:aircraftId/zones': () => ({}),
  'POST /api/aircraft/:aircraftId/zones': ({ unique }) => ({
    json: { name: unique(), kind: 'other', celsius: 20 },
  }),
  'PATCH /api/aircraft/:aircraftId/zones/:zoneId': ({ unique }) => ({
    json: { version, name: unique(), kind: 'other' },
  }),
  'DELETE /api/aircraft/:aircraftId/zones/:zoneId': () => versionInQuery,
  'POST /api/aircraft/:aircraftId/states': ({ unique, ids }) => ({
    json: { name: unique(), copyFromStateId: ids.stateId },
  }),
  'PATCH /api/aircraft/:aircraftId/states/:stateId': ({ unique }) => ({ json: { version, name: unique() } }),
  'DELETE /api/aircraft/:aircraftId/states/:stateId': () => versionInQuery,
  'PUT /api/aircraft/:aircraftId/states/:stateId/temperatures/:zoneId': () => ({
    json: { version, celsius: 21 },
  }),

  [`GET ${DISPLAYS}`]: () => ({}),
  [`POST ${DISPLAYS}`]: ({ ids, unique }) => ({ json: displayInput(ids.zoneId, { name: unique() }) }),
  [`PATCH ${DISPLAYS}/:displayId`]: ({ ids, unique }) => ({
    json: { ...displayInput(ids.zoneId, { name: unique() }), version },
  }),
  [`DELETE ${DISPLAYS}/:displayId`]: () => versionInQuery,

  'GET /api/aircraft/:aircraftId/channels': () => ({}),
  'POST /api/aircraft/:aircraftId/channels': ({ ids, unique }) => ({
    json: thermocoupleInput(ids.zoneId, { tag: unique() }),
  }),
  [`GET ${CHANNEL}`]: () => ({}),
  [`PATCH ${CHANNEL}`]: ({ ids, unique }) => ({
    json: { ...thermocoupleInput(ids.zoneId, { tag: unique() }), version },
  }),
  [`DELETE ${CHANNEL}`]: () => versionInQuery,
  [`PUT ${CHANNEL}/probe`]: () => ({ json: probeInput({ version }) }),
  [`DELETE ${CHANNEL}/probe`]: () => versionInQuery,
  [`PUT ${CHANNEL}/run`]: ({ ids }) => ({ json: { version, run: runInput(ids.zoneId) } }),
  [`DELETE ${CHANNEL}/run`]: () => versionInQuery,
} satisfies Record<RouteKey, (facts: Facts) => Sample>
