import type { EngineLayOut } from '#shared/domain/engineLayout'
import { EngineLayoutError, layOutEngine } from '#shared/domain/engineLayout'
import type { CreateAircraftInput, EngineLayout } from '#shared/schemas/aircraft'
import type { Transaction } from '~~/server/db/client'
import { invalidField } from '~~/server/http/appError'
import { insertChannels } from '~~/server/repositories/channels'
import { insertDisplay } from '~~/server/repositories/displays'
import { insertStates } from '~~/server/repositories/operatingStates'
import { insertZones } from '~~/server/repositories/zones'
import { insertTemperatures } from '~~/server/repositories/zoneTemperatures'

/** What the engine needs, or the field of the request that asks for what it cannot have. */
export function layOutOrRefuse(layout: EngineLayout): EngineLayOut {
  try {
    return layOutEngine(layout)
  } catch (error) {
    if (error instanceof EngineLayoutError) throw invalidField(`layout.${error.field}`, error.message)
    throw error
  }
}

type IdOf = (zoneKey: string) => number

/** Stores everything a new aircraft begins with. */
export async function storeLayOut(
  tx: Transaction,
  aircraftId: number,
  layOut: EngineLayOut,
  { displayName }: Pick<CreateAircraftInput, 'displayName'>,
): Promise<void> {
  const idOf = await storeZones(tx, aircraftId, layOut)
  await storeStates(tx, aircraftId, layOut, idOf)
  const displayId = await insertDisplay(tx, aircraftId, {
    name: displayName,
    inputs: layOut.display.inputs,
    terminalZoneId: idOf(layOut.display.terminalZone),
    compensation: { kind: 'internal', sensorOffsetKelvin: 0 },
    gainErrorFraction: 0,
    offsetKelvin: 0,
    lowCelsius: null,
    highCelsius: null,
    notes: '',
  })
  await storeChannels(tx, aircraftId, layOut, { idOf, displayId })
}

async function storeZones(tx: Transaction, aircraftId: number, { zones }: EngineLayOut): Promise<IdOf> {
  const ids = await insertZones(
    tx,
    aircraftId,
    zones.map(({ name, kind }, position) => ({ name, kind, position })),
  )
  const byKey = new Map(zones.map((zone, index) => [zone.key, ids[index]]))
  return (zoneKey) => {
    const id = byKey.get(zoneKey)
    if (id === undefined) throw new Error(`The lay-out has no zone "${zoneKey}".`)
    return id
  }
}

async function storeStates(
  tx: Transaction,
  aircraftId: number,
  { states }: EngineLayOut,
  idOf: IdOf,
): Promise<void> {
  const ids = await insertStates(
    tx,
    aircraftId,
    states.map(({ name }, position) => ({ name, position })),
  )
  const temperatures = ids.flatMap((stateId, index) =>
    Object.entries(states[index]?.zoneCelsius ?? {}).map(([zoneKey, celsius]) => ({
      stateId,
      zoneId: idOf(zoneKey),
      celsius,
    })),
  )
  await insertTemperatures(tx, aircraftId, temperatures)
}

async function storeChannels(
  tx: Transaction,
  aircraftId: number,
  { channels }: EngineLayOut,
  { idOf, displayId }: { idOf: IdOf; displayId: number },
): Promise<void> {
  const values = channels.map(({ tipZone, ...channel }, position) => ({
    ...channel,
    position,
    tipZoneId: tipZone === null ? null : idOf(tipZone),
    displayId,
    typeSetting: channel.thermocoupleType,
    workingLowCelsius: null,
    workingHighCelsius: null,
    notes: '',
  }))
  await insertChannels(tx, aircraftId, values)
}
