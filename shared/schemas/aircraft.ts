import { z } from 'zod'
import { lineSchema, versionSchema } from './numbers'

export const COOLINGS = ['air', 'liquid'] as const
export const IGNITIONS = ['two-magnetos', 'magneto-and-electronic', 'two-electronic'] as const
export const CABLE_STANDARDS = ['astm-e230', 'iec-60584-3'] as const

/** What an engine layout can be asked to instrument. */
export const QUANTITIES = [
  'exhaust-gas-temperature',
  'cylinder-head-temperature',
  'oil-temperature',
  'coolant-temperature',
  'intake-air-temperature',
  'outside-air-temperature',
  'oil-pressure',
  'fuel-pressure',
  'fuel-flow',
  'manifold-pressure',
  'engine-speed',
  'bus-voltage',
  'alternator-current',
  'other-temperature',
] as const
export type Quantity = (typeof QUANTITIES)[number]

export const engineLayoutSchema = z
  .object({
    cylinders: z
      .number({
        invalid_type_error: 'Enter the number of cylinders.',
        required_error: 'Enter the number of cylinders.',
      })
      .int('Enter a whole number of cylinders.')
      .min(1, 'An engine has at least one cylinder.')
      .max(12, 'Enter at most 12 cylinders.'),
    cooling: z.enum(COOLINGS),
    ignition: z.enum(IGNITIONS),
    quantities: z
      .array(z.enum(QUANTITIES))
      .min(1, 'Choose at least one quantity to measure.')
      .refine((list) => new Set(list).size === list.length, 'Name each quantity once.'),
  })
  .strict()
  .refine(({ cooling, quantities }) => cooling !== 'air' || !quantities.includes('coolant-temperature'), {
    message: 'An air-cooled engine has no coolant to measure.',
    path: ['quantities'],
  })
export type EngineLayout = z.infer<typeof engineLayoutSchema>

export const createAircraftSchema = z
  .object({
    name: lineSchema('a name for the project', 80),
    registration: z.string().trim().max(20, 'Use at most 20 characters.').default(''),
    cableStandard: z.enum(CABLE_STANDARDS),
    displayName: lineSchema('a name for the display', 80),
    layout: engineLayoutSchema,
  })
  .strict()
export type CreateAircraftInput = z.infer<typeof createAircraftSchema>

export const updateAircraftSchema = z
  .object({
    version: versionSchema,
    name: lineSchema('a name for the project', 80),
    registration: z.string().trim().max(20, 'Use at most 20 characters.'),
    cableStandard: z.enum(CABLE_STANDARDS),
  })
  .strict()
export type UpdateAircraftInput = z.infer<typeof updateAircraftSchema>

/** Archive, restore, delete: nothing but the version the decision was based on. */
export const versionOnlySchema = z.object({ version: versionSchema }).strict()
