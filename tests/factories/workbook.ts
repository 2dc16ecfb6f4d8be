import type { CreateAircraftInput } from '#shared/schemas/aircraft'
import type {
  Aircraft,
  Channel,
  ChannelRow,
  ChannelTable,
  Display,
  Zone,
  ZoneGrid,
} from '#shared/types/workbook'
import type { Client } from './client'
import { signUp } from './client'
import { aircraftInput } from './records'

/** An aircraft over the API, with what tests ask for most. */
export interface Workbook {
  client: Client
  aircraft: Aircraft
  /** `/api/aircraft/12` */
  path: string
  zone(name: string): Zone
  grid: ZoneGrid
  display: Display
  channel(tag: string): Channel
}

/** Registers somebody who creates an aircraft. */
export async function createWorkbook(changes: Partial<CreateAircraftInput> = {}): Promise<Workbook> {
  const client = await signUp()
  const { aircraft } = await client.must<{ aircraft: Aircraft }>(
    'POST',
    '/api/aircraft',
    aircraftInput(changes),
  )
  const path = `/api/aircraft/${aircraft.id}`
  const grid = await client.must<ZoneGrid>('GET', `${path}/zones`)
  const { displays } = await client.must<{ displays: Display[] }>('GET', `${path}/displays`)
  const rows = await channelRows(client, path)
  return {
    client,
    aircraft,
    path,
    grid,
    display: found(displays[0], 'display'),
    zone: (name) =>
      found(
        grid.zones.find((zone) => zone.name === name),
        name,
      ),
    channel: (tag) => found(rows.find(({ channel }) => channel.tag === tag)?.channel, tag),
  }
}

/** Every channel of an aircraft with its stored readings. */
export async function channelRows(client: Client, path: string): Promise<ChannelRow[]> {
  const table = await client.must<ChannelTable>('GET', `${path}/channels?pageSize=200`)
  return table.rows.items
}

function found<Record>(record: Record | undefined, name: string): Record {
  if (record === undefined) throw new Error(`The test aircraft has no ${name}.`)
  return record
}
