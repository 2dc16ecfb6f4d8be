import { z } from 'zod'

/** Row id taken from a path or a body. */
export const idSchema = z.coerce
  .number()
  .int()
  .positive()
  .max(2 ** 53 - 1)

/** Version a write is based on. */
export const versionSchema = z.number().int().positive()

/** Absolute zero is the one lower bound that holds everywhere; above 3000 °C no zone of an engine lies. */
export const celsiusSchema = z
  .number({ invalid_type_error: 'Enter a temperature as a number.', required_error: 'Enter a temperature.' })
  .finite('Enter a temperature as a number.')
  .min(-273.15, 'A temperature cannot be below absolute zero (−273.15 °C).')
  .max(3000, 'Enter a temperature of at most 3000 °C.')

/** A temperature difference, kelvin. */
export const kelvinSchema = z
  .number({ invalid_type_error: 'Enter a temperature difference as a number.' })
  .finite('Enter a temperature difference as a number.')
  .min(-500, 'Enter a difference of at least −500 K.')
  .max(500, 'Enter a difference of at most 500 K.')

/** One line of text that must not be empty. */
export function lineSchema(what: string, max: number) {
  return z
    .string({ required_error: `Enter ${what}.`, invalid_type_error: `Enter ${what}.` })
    .trim()
    .min(1, `Enter ${what}.`)
    .max(max, `Use at most ${max} characters.`)
}

export const notesSchema = z.string().trim().max(2000, 'Use at most 2,000 characters.')
