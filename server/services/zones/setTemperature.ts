import type { SetTemperatureInput } from '#shared/schemas/zone'
import type { ZoneTemperature } from '#shared/types/workbook'
import type { Transaction } from '~~/server/db/client'
import { notFound } from '~~/server/http/appError'
import { listChannels } from '~~/server/repositories/channels'
import { listReadings } from '~~/server/repositories/expectedReadings'
import { findTemperature, updateTemperature } from '~~/server/repositories/zoneTemperatures'
import type { AircraftScope } from '../aircraft/changeAircraft'
import { changeAircraft } from '../aircraft/changeAircraft'
import { recordWrite, requireVersion } from '../aircraft/recordWrite'
import type { MovedChannel } from '../expectedReadings/moved'
import { movedChannels } from '../expectedReadings/moved'
import { rewriteReadings } from '../expectedReadings/rewriteReadings'

type Cell = Pick<ZoneTemperature, 'stateId' | 'zoneId'>

async function requireTemperature(tx: Transaction, aircraftId: number, cell: Cell): Promise<ZoneTemperature> {
  const temperature = await findTemperature(tx, aircraftId, cell)
  if (!temperature) throw notFound('zone temperature')
  return temperature
}

function temperatureSubject({ stateId, zoneId }: Cell) {
  return {
    entity: 'temperature',
    entityId: zoneId,
    distinguishedBy: { stateId },
    called: 'temperature of this zone',
  } as const
}

/** Sets the temperature of a zone in one operating state, and says which channels now read something else. */
export function setTemperature(
  scope: AircraftScope,
  cell: Cell,
  { version, celsius }: SetTemperatureInput,
): Promise<{ temperature: ZoneTemperature; moved: MovedChannel[] }> {
  const { aircraftId } = scope
  return changeAircraft(scope, async (tx) => {
    const before = await requireTemperature(tx, aircraftId, cell)
    await requireVersion(tx, scope, temperatureSubject(cell), before, version)
    const readBefore = await listReadings(tx, aircraftId)
    await updateTemperature(tx, aircraftId, before, celsius)
    await rewriteReadings(tx, aircraftId)
    const temperature = await requireTemperature(tx, aircraftId, cell)
    await recordWrite(tx, scope, {
      action: 'temperature.set',
      entityId: cell.zoneId,
      before,
      after: temperature,
    })
    const channels = await listChannels(tx, aircraftId)
    const readNow = await listReadings(tx, aircraftId)
    return { temperature, moved: movedChannels(cell.stateId, channels, readBefore, readNow) }
  })
}
