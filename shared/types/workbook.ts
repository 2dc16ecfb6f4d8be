import type { Role } from '../domain/permissions'
import type { EngineLayout, CABLE_STANDARDS } from '../schemas/aircraft'
import type { ChannelFields } from '../schemas/channel'
import type { CreateDisplayInput } from '../schemas/display'
import type { LogProbeInput } from '../schemas/probe'
import type { WiringRunInput } from '../schemas/run'
import type { ZoneKind } from '../schemas/zone'
import type { FindingCode, Indication } from '../thermometry/run'

/** Records of the workbook as the API returns them. Times are ISO 8601 in UTC. */

export interface Versioned {
  id: number
  version: number
}

export interface Aircraft extends Versioned {
  name: string
  registration: string
  cableStandard: (typeof CABLE_STANDARDS)[number]
  layout: EngineLayout
  archivedAt: string | null
  createdAt: string
}

export interface Zone extends Versioned {
  name: string
  kind: ZoneKind
  position: number
}

export interface OperatingState extends Versioned {
  name: string
  position: number
}

export interface ZoneTemperature {
  stateId: number
  zoneId: number
  celsius: number
  version: number
}

export type Display = Versioned & CreateDisplayInput

export type Channel = Versioned & ChannelFields & { position: number }

export type Probe = Versioned & Omit<LogProbeInput, 'version'> & { channelId: number; loggedAt: string }

export type WiringRun = Versioned & WiringRunInput & { channelId: number; savedAt: string }

/** The run solver's answer as stored when the record it rests on was last written. */
export interface ExpectedReading {
  channelId: number
  stateId: number
  tipCelsius: number
  terminalMillivolts: number | null
  indication: Indication
  errorKelvin: number | null
  findingCodes: FindingCode[]
}

/** Zones, operating states and the temperature of each zone in each state. */
export interface ZoneGrid {
  zones: Zone[]
  states: OperatingState[]
  temperatures: ZoneTemperature[]
}

/** Where a channel stands: the first thing still missing, or what the solver found. */
export const CHANNEL_STANDINGS = [
  'planned',
  'no-display',
  'no-run',
  'faults',
  'as-intended',
  'record-only',
] as const
export type ChannelStanding = (typeof CHANNEL_STANDINGS)[number]

export interface ChannelRow {
  channel: Channel
  displayName: string | null
  hasProbe: boolean
  hasRun: boolean
  standing: ChannelStanding
  readings: ExpectedReading[]
  /** Largest |error| over the states, kelvin; null when none is a number. */
  worstErrorKelvin: number | null
  findingCodes: FindingCode[]
}

export interface Page<Item> {
  items: Item[]
  total: number
  page: number
  pageSize: number
}

export interface AircraftListItem {
  aircraft: Aircraft
  roles: Role[]
  channels: number
  /** Channels by standing. */
  standings: Record<ChannelStanding, number>
}

export interface Person {
  userId: number
  displayName: string
  roles: Role[]
}

/** GET /api/aircraft/:aircraftId */
export interface AircraftSheet extends AircraftListItem {
  people: Person[]
  states: OperatingState[]
}

/** GET /api/aircraft/:aircraftId/channels */
export interface ChannelTable {
  states: OperatingState[]
  rows: Page<ChannelRow>
}

/** GET /api/aircraft/:aircraftId/channels/:channelId: everything the channel sheet and the run editor need. */
export interface ChannelSheet {
  aircraft: Aircraft
  roles: Role[]
  channel: Channel
  probe: Probe | null
  run: WiringRun | null
  display: Display | null
  grid: ZoneGrid
  readings: ExpectedReading[]
  standing: ChannelStanding
  /** Tag and id of the channels before and after this one in the aircraft's order. */
  previous: { id: number; tag: string } | null
  next: { id: number; tag: string } | null
}

export interface HistoryEvent {
  sequence: number
  at: string
  actorId: number | null
  actorName: string | null
  action: string
  entity: string
  entityId: number | null
  before: Record<string, unknown> | null
  after: Record<string, unknown> | null
  hash: string
}
