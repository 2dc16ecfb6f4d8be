import { z } from 'zod'
import { celsiusSchema, lineSchema, versionSchema } from './numbers'

export const ZONE_KINDS = [
  'exhaust',
  'cylinder-head',
  'oil',
  'coolant',
  'intake',
  'engine-bay',
  'firewall',
  'cabin',
  'panel',
  'terminals',
  'outside',
  'other',
] as const
export type ZoneKind = (typeof ZONE_KINDS)[number]

export const createZoneSchema = z
  .object({
    name: lineSchema('a name for the zone', 60),
    kind: z.enum(ZONE_KINDS),
    /** Temperature in every operating state to begin with, °C. */
    celsius: celsiusSchema,
  })
  .strict()
export type CreateZoneInput = z.infer<typeof createZoneSchema>

export const updateZoneSchema = z
  .object({ version: versionSchema, name: lineSchema('a name for the zone', 60), kind: z.enum(ZONE_KINDS) })
  .strict()
export type UpdateZoneInput = z.infer<typeof updateZoneSchema>

export const createStateSchema = z
  .object({
    name: lineSchema('a name for the operating state', 60),
    /** State whose zone temperatures the new one starts with. */
    copyFromStateId: z.number().int().positive(),
  })
  .strict()
export type CreateStateInput = z.infer<typeof createStateSchema>

export const updateStateSchema = z
  .object({ version: versionSchema, name: lineSchema('a name for the operating state', 60) })
  .strict()
export type UpdateStateInput = z.infer<typeof updateStateSchema>

export const setTemperatureSchema = z.object({ version: versionSchema, celsius: celsiusSchema }).strict()
export type SetTemperatureInput = z.infer<typeof setTemperatureSchema>
