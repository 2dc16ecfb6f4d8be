import { z } from 'zod'
import { LETTER_TYPES } from '../thermometry/its90'
import { compensationSchema } from './display'
import { celsiusSchema, kelvinSchema } from './numbers'
import { checkParts, MAX_SECTIONS, runJointSchema, runSectionSchema, terminalContactsSchema } from './run'

/** A number written in an address: whole text must be a number, so that `12abc` or an empty value is refused. */
function queryNumber(what: string) {
  return z
    .string()
    .trim()
    .regex(/^[+-]?(\d+\.?\d*|\.\d+)([eE][+-]?\d+)?$/, `${what} must be a number, such as 300 or -12.5.`)
    .transform(Number)
    .refine(Number.isFinite, `${what} is too large.`)
}

const letterType = z.enum(LETTER_TYPES, {
  errorMap: () => ({ message: `type must be one of ${LETTER_TYPES.join(', ')}.` }),
})

export const thermocoupleQuerySchema = z
  .object({
    type: letterType,
    celsius: queryNumber('celsius').optional(),
    millivolts: queryNumber('millivolts').optional(),
    coldJunctionCelsius: queryNumber('coldJunctionCelsius').optional(),
  })
  .strict()
  .superRefine((query, context) => {
    const given = [query.celsius, query.millivolts].filter((value) => value !== undefined).length
    if (given !== 1)
      context.addIssue({
        code: z.ZodIssueCode.custom,
        path: [given === 0 ? 'celsius' : 'millivolts'],
        message: 'Give either celsius or millivolts, not both.',
      })
  })
export type ThermocoupleQuery = z.infer<typeof thermocoupleQuerySchema>

export const displayInputSchema = z
  .object({
    typeSetting: letterType,
    compensation: compensationSchema,
    gainErrorFraction: z.number().finite().min(-0.5).max(0.5).default(0),
    offsetKelvin: kelvinSchema.default(0),
    lowCelsius: celsiusSchema.nullable().default(null),
    highCelsius: celsiusSchema.nullable().default(null),
  })
  .strict()

export const thermocoupleRunSchema = z
  .object({
    type: letterType,
    tipZone: z.string().min(1).max(60),
    sections: z.array(runSectionSchema).min(1, 'A run has at least one section.').max(MAX_SECTIONS),
    joints: z.array(runJointSchema).max(MAX_SECTIONS - 1),
    terminals: terminalContactsSchema.extend({ zone: z.string().min(1).max(60) }).strict(),
    display: displayInputSchema,
  })
  .strict()
  .superRefine(checkParts)

const zoneCelsius = z.record(z.string().min(1).max(60), celsiusSchema)

/** Either one set of `conditions`, or `states` to be solved together with the worst over them. */
export const benchRunSchema = z
  .object({
    run: thermocoupleRunSchema,
    conditions: z.object({ zoneCelsius }).strict().optional(),
    states: z
      .array(
        z.object({ id: z.string().min(1).max(60), name: z.string().min(1).max(60), zoneCelsius }).strict(),
      )
      .min(1)
      .max(24)
      .optional(),
  })
  .strict()
  .superRefine((body, context) => {
    if ((body.conditions === undefined) === (body.states === undefined)) {
      context.addIssue({
        code: z.ZodIssueCode.custom,
        path: ['conditions'],
        message: 'Give either conditions or states.',
      })
      return
    }
    const needed = new Set([body.run.tipZone, body.run.terminals.zone])
    body.run.joints.forEach((joint) => needed.add(joint.tipSideZone).add(joint.displaySideZone))
    const sets = body.conditions
      ? [{ path: ['conditions', 'zoneCelsius'], zones: body.conditions.zoneCelsius }]
      : (body.states ?? []).map((state, i) => ({
          path: ['states', i, 'zoneCelsius'],
          zones: state.zoneCelsius,
        }))
    for (const { path, zones } of sets)
      for (const zone of needed)
        if (!Object.hasOwn(zones, zone))
          context.addIssue({
            code: z.ZodIssueCode.custom,
            path: [...path, zone],
            message: `The run passes the zone "${zone}", but no temperature is given for it.`,
          })
  })
export type BenchRunInput = z.infer<typeof benchRunSchema>
