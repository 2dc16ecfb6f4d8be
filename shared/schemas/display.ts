import { z } from 'zod'
import { celsiusSchema, kelvinSchema, lineSchema, notesSchema, versionSchema } from './numbers'

/** The same shapes as the run solver's `Compensation`. */
export const compensationSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('internal'), sensorOffsetKelvin: kelvinSchema }).strict(),
  z.object({ kind: z.literal('remote-block'), sensorOffsetKelvin: kelvinSchema }).strict(),
  z.object({ kind: z.literal('fixed'), celsius: celsiusSchema }).strict(),
  z.object({ kind: z.literal('none') }).strict(),
  z.object({ kind: z.literal('adds-degrees'), sensorOffsetKelvin: kelvinSchema }).strict(),
  z.object({ kind: z.literal('zeroed'), ambientCelsius: celsiusSchema }).strict(),
])

export const displayFieldsSchema = z
  .object({
    name: lineSchema('a name for the display', 80),
    inputs: z
      .number({ invalid_type_error: 'Enter the number of inputs.' })
      .int('Enter a whole number of inputs.')
      .min(1, 'A display has at least one input.')
      .max(64, 'Enter at most 64 inputs.'),
    terminalZoneId: z.number({ required_error: 'Choose the zone of the terminals.' }).int().positive(),
    compensation: compensationSchema,
    gainErrorFraction: z
      .number()
      .finite()
      .min(-0.5, 'Enter a gain error of at least −50 %.')
      .max(0.5, 'Enter a gain error of at most 50 %.'),
    offsetKelvin: kelvinSchema,
    lowCelsius: celsiusSchema.nullable(),
    highCelsius: celsiusSchema.nullable(),
    notes: notesSchema,
  })
  .strict()

type Limits = { lowCelsius: number | null; highCelsius: number | null }
const lowBelowHigh = (display: Limits) =>
  display.lowCelsius === null || display.highCelsius === null || display.lowCelsius < display.highCelsius
const lowBelowHighIssue = {
  message: 'The top of the range must lie above its bottom.',
  path: ['highCelsius'],
}

export const createDisplaySchema = displayFieldsSchema.refine(lowBelowHigh, lowBelowHighIssue)
export type CreateDisplayInput = z.infer<typeof createDisplaySchema>

export const updateDisplaySchema = displayFieldsSchema
  .extend({ version: versionSchema })
  .refine(lowBelowHigh, lowBelowHighIssue)
export type UpdateDisplayInput = z.infer<typeof updateDisplaySchema>
