import { z } from 'zod'
import { LETTER_TYPES } from '../thermometry/its90'
import { lineSchema, notesSchema, versionSchema } from './numbers'

export const TIP_STYLES = ['grounded', 'ungrounded', 'exposed'] as const
export const PROBE_STYLES = [
  'bayonet',
  'gasket-ring',
  'clamp',
  'threaded',
  'immersion',
  'surface',
  'free-air',
] as const

/** A probe fitted to a channel. `version` is null when none was logged before. */
export const logProbeSchema = z
  .object({
    version: versionSchema.nullable(),
    marking: lineSchema('the marking or serial number on the probe', 60),
    thermocoupleType: z.enum(LETTER_TYPES).nullable(),
    tipStyle: z.enum(TIP_STYLES),
    style: z.enum(PROBE_STYLES),
    leadLengthMetres: z
      .number({ invalid_type_error: 'Enter the length as a number.' })
      .min(0, 'A length cannot be negative.')
      .max(50, 'Enter at most 50 m.')
      .nullable(),
    notes: notesSchema,
  })
  .strict()
export type LogProbeInput = z.infer<typeof logProbeSchema>
