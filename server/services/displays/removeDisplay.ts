import { conflict } from '~~/server/http/appError'
import { tagsOnDisplay } from '~~/server/repositories/displayInputs'
import { deleteDisplay } from '~~/server/repositories/displays'
import type { AircraftScope } from '../aircraft/changeAircraft'
import { changeAircraft } from '../aircraft/changeAircraft'
import { recordWrite, requireVersion } from '../aircraft/recordWrite'
import { nameSome } from '../wording'
import { displaySubject, requireDisplay } from './requireDisplay'

/** Removes a display that reads no channel. */
export function removeDisplay(scope: AircraftScope, displayId: number, version: number): Promise<void> {
  const { aircraftId } = scope
  return changeAircraft(scope, async (tx) => {
    const display = await requireDisplay(tx, aircraftId, displayId)
    await requireVersion(tx, scope, displaySubject(display), display, version)
    const tags = await tagsOnDisplay(tx, aircraftId, displayId)
    if (tags.length > 0) throw conflict(`"${display.name}" reads ${nameSome(tags)}.`)
    await deleteDisplay(tx, aircraftId, displayId)
    await recordWrite(tx, scope, {
      action: 'display.deleted',
      entityId: displayId,
      before: display,
      after: null,
    })
  })
}
