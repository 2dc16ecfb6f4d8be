import { describe, expect, it } from 'vitest'
import type { Zone } from '#shared/types/workbook'
import { AppError } from '~~/server/http/appError'
import { checkZones } from '~~/server/services/runs/checkZones'
import { runInput } from '../../../factories/records'

const zones: Zone[] = [{ id: 7, version: 1, name: 'Engine bay', kind: 'engine-bay', position: 0 }]

function refusal(zoneId: number): AppError | undefined {
  try {
    checkZones(runInput(zoneId), zones)
    return undefined
  } catch (error) {
    if (error instanceof AppError) return error
    throw error
  }
}

describe('the zones a run passes', () => {
  it('are accepted when the aircraft has them', () => {
    expect(refusal(7)).toBeUndefined()
  })

  it('are each named when it does not', () => {
    expect(refusal(8)).toMatchObject({
      code: 'invalid-input',
      status: 422,
      errors: [{ field: 'run.joints.0.tipSideZone' }, { field: 'run.joints.0.displaySideZone' }],
    })
  })

  it('are none where the run is the probe alone', () => {
    const run = { ...runInput(8), joints: [] }
    expect(() => checkZones(run, zones)).not.toThrow()
  })
})
