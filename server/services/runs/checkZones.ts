import type { WiringRunInput } from '#shared/schemas/run'
import type { FieldProblem } from '#shared/types/problem'
import type { Zone } from '#shared/types/workbook'
import { AppError } from '~~/server/http/appError'

const SIDES = ['tipSideZone', 'displaySideZone'] as const

/** Refuses a run that passes a zone the aircraft does not have, naming every such field. */
export function checkZones({ joints }: WiringRunInput, zones: readonly Zone[]): void {
  const keys = new Set(zones.map((zone) => String(zone.id)))
  const errors = joints.flatMap((joint, index): FieldProblem[] =>
    SIDES.filter((side) => !keys.has(joint[side])).map((side) => ({
      field: `run.joints.${index}.${side}`,
      reason: 'This aircraft has no such zone.',
    })),
  )
  if (errors.length > 0)
    throw new AppError('invalid-input', 'The run passes a zone that this aircraft does not have.', { errors })
}
