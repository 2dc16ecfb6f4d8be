import type { Channel, OperatingState, Zone } from '#shared/types/workbook'
import type { Transaction } from '~~/server/db/client'
import { listChannels } from '~~/server/repositories/channels'
import type { AircraftScope } from '~~/server/services/aircraft/changeAircraft'
import { createAircraft } from '~~/server/services/aircraft/createAircraft'
import { updateChannel } from '~~/server/services/channels/updateChannel'
import { createDisplay } from '~~/server/services/displays/createDisplay'
import { grantRoles } from '~~/server/services/people/grantRoles'
import { logProbe } from '~~/server/services/probes/logProbe'
import { saveRun } from '~~/server/services/runs/saveRun'
import { loadGrid } from '~~/server/services/zones/loadGrid'
import { setTemperature } from '~~/server/services/zones/setTemperature'
import { DEMO_PROBES } from './data/probes'
import { DEMO_AIR_GAUGE, DEMO_AIRCRAFT, DEMO_TEMPERATURES, DEMO_TYPE_SETTINGS } from './data/project'
import type { DemoRun } from './data/runs'
import { DEMO_RUNS } from './data/runs'
import type { DemoCast } from './storePeople'

/** The records of the demo by the names its data use. */
interface Named {
  zone(name: string): Zone
  state(name: string): OperatingState
  channel(tag: string): Channel
}

/** Builds the project as its people would have: the owner plans it, the builder wires it. */
export async function storeProject(tx: Transaction, cast: DemoCast): Promise<void> {
  const { aircraft } = await createAircraft(cast.owner, DEMO_AIRCRAFT, tx)
  const asOwner = { account: cast.owner, aircraftId: aircraft.id, within: tx }
  for (const role of ['builder', 'inspector', 'mentor'] as const)
    await grantRoles(asOwner, cast[role].id, [role])
  const named = await nameRecords(tx, aircraft.id)
  await setTemperatures(asOwner, named)
  await setDisplays(asOwner, named)
  await logWork({ ...asOwner, account: cast.builder }, named)
}

async function nameRecords(tx: Transaction, aircraftId: number): Promise<Named> {
  const { zones, states } = await loadGrid(tx, aircraftId)
  const channels = await listChannels(tx, aircraftId)
  return {
    zone: (name) => one(zones, (zone) => zone.name === name, name),
    state: (name) => one(states, (state) => state.name === name, name),
    channel: (tag) => one(channels, (channel) => channel.tag === tag, tag),
  }
}

function one<Item>(items: readonly Item[], isIt: (item: Item) => boolean, name: string): Item {
  const item = items.find(isIt)
  if (!item) throw new Error(`The demo has no "${name}".`)
  return item
}

async function setTemperatures(scope: AircraftScope, named: Named): Promise<void> {
  for (const { state, zone, celsius } of DEMO_TEMPERATURES) {
    const cell = { stateId: named.state(state).id, zoneId: named.zone(zone).id }
    await setTemperature(scope, cell, { version: 1, celsius })
  }
}

async function setDisplays(scope: AircraftScope, named: Named): Promise<void> {
  const { channels, ...fields } = DEMO_AIR_GAUGE
  const terminalZoneId = named.zone('Display terminals').id
  const { display } = await createDisplay(scope, { ...fields, terminalZoneId })
  for (const [index, tag] of channels.entries())
    await changeChannel(scope, named.channel(tag), { displayId: display.id, inputNumber: index + 1 })
  for (const { tag, typeSetting } of DEMO_TYPE_SETTINGS)
    await changeChannel(scope, named.channel(tag), { typeSetting })
}

async function changeChannel(
  scope: AircraftScope,
  { id, position: _position, ...fields }: Channel,
  changes: Partial<Channel>,
): Promise<void> {
  await updateChannel(scope, id, { ...fields, ...changes })
}

async function logWork(scope: AircraftScope, named: Named): Promise<void> {
  for (const [tag, probe] of Object.entries(DEMO_PROBES)) {
    const { id, thermocoupleType } = named.channel(tag)
    await logProbe(scope, id, { ...probe, thermocoupleType, version: null })
  }
  for (const [tag, run] of Object.entries(DEMO_RUNS))
    await saveRun(scope, named.channel(tag).id, { version: null, run: withZoneIds(run, named) })
}

function withZoneIds(run: DemoRun, named: Named): DemoRun {
  const joints = run.joints.map((joint) => ({
    ...joint,
    tipSideZone: String(named.zone(joint.tipSideZone).id),
    displaySideZone: String(named.zone(joint.displaySideZone).id),
  }))
  return { ...run, joints }
}
