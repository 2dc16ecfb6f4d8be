import { z } from 'zod'

const PAGE_SIZE = 50
const MAX_PAGE_SIZE = 200

const whole = (what: string) =>
  z.coerce
    .number({ invalid_type_error: `${what} must be a whole number.` })
    .int(`${what} must be a whole number.`)
    .min(1, `${what} begins at 1.`)

/** `?page=2&pageSize=50`, as every list takes it. */
export const pageQuerySchema = z
  .object({
    page: whole('page').max(1_000_000, 'There is no such page.').default(1),
    pageSize: whole('pageSize')
      .max(MAX_PAGE_SIZE, `A page has at most ${MAX_PAGE_SIZE} items.`)
      .default(PAGE_SIZE),
  })
  .strict()
export type PageQuery = z.infer<typeof pageQuerySchema>

/** `?archived=true` lists the archived ones in place of the others. */
export const aircraftQuerySchema = pageQuerySchema
  .extend({
    archived: z
      .enum(['true', 'false'])
      .default('false')
      .transform((text) => text === 'true'),
  })
  .strict()
export type AircraftQuery = z.infer<typeof aircraftQuerySchema>

/** `?version=3`: the version a removal is based on. */
export const versionQuerySchema = z.object({ version: whole('version') }).strict()
