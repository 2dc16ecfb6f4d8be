import { z } from 'zod'
import { LETTER_TYPES } from '../thermometry/its90'
import { QUANTITIES } from './aircraft'
import { celsiusSchema, lineSchema, notesSchema, versionSchema } from './numbers'

export const SENSORS = [
  'thermocouple',
  'platinum-rtd',
  'thermistor',
  'resistive-sender',
  'voltage-transmitter',
  'current-transmitter',
  'pulse',
  'direct',
] as const
export type Sensor = (typeof SENSORS)[number]

export const channelFieldsSchema = z
  .object({
    tag: lineSchema('a tag such as EGT 3', 20),
    quantity: z.enum(QUANTITIES),
    cylinder: z.number().int().min(1).max(12).nullable(),
    sensor: z.enum(SENSORS),
    /** Planned type: what probe, cable and display input should all be. Thermocouples only. */
    thermocoupleType: z.enum(LETTER_TYPES).nullable(),
    /** Zone in which the probe's tip sits. */
    tipZoneId: z.number().int().positive().nullable(),
    displayId: z.number().int().positive().nullable(),
    inputNumber: z.number().int().min(1).max(64).nullable(),
    /** Type the display input is set to, right or wrong. Thermocouples only. */
    typeSetting: z.enum(LETTER_TYPES).nullable(),
    workingLowCelsius: celsiusSchema.nullable(),
    workingHighCelsius: celsiusSchema.nullable(),
    notes: notesSchema,
  })
  .strict()
export type ChannelFields = z.infer<typeof channelFieldsSchema>

/** Rules that tie fields of a channel together; each names the field to mend. */
function checkChannel(channel: ChannelFields, context: z.RefinementCtx): void {
  const refuse = (path: keyof ChannelFields, message: string) =>
    context.addIssue({ code: z.ZodIssueCode.custom, path: [path], message })
  if (channel.sensor === 'thermocouple') {
    if (channel.thermocoupleType === null) refuse('thermocoupleType', 'Choose the thermocouple type.')
    if (channel.tipZoneId === null) refuse('tipZoneId', 'Choose the zone in which the tip sits.')
    if (channel.displayId !== null && channel.typeSetting === null)
      refuse('typeSetting', 'Choose the type the display input is set to.')
  } else {
    if (channel.thermocoupleType !== null)
      refuse('thermocoupleType', 'Only a thermocouple channel has a thermocouple type.')
    if (channel.typeSetting !== null) refuse('typeSetting', 'Only a thermocouple input has a type setting.')
  }
  if ((channel.displayId === null) !== (channel.inputNumber === null))
    refuse('inputNumber', 'Give both the display and the input number, or neither.')
  const { workingLowCelsius: low, workingHighCelsius: high } = channel
  if (low !== null && high !== null && low >= high)
    refuse('workingHighCelsius', 'The top of the working range must lie above its bottom.')
}

export const createChannelSchema = channelFieldsSchema.superRefine(checkChannel)
export type CreateChannelInput = z.infer<typeof createChannelSchema>

export const updateChannelSchema = channelFieldsSchema
  .extend({ version: versionSchema })
  .superRefine((input, context) => checkChannel(input, context))
export type UpdateChannelInput = z.infer<typeof updateChannelSchema>
