import { z } from 'zod'

/** Length limits follow OWASP ASVS 5.0 §6.2: at least 8 characters, long ones and pasting allowed. */
const password = z
  .string({ required_error: 'Enter a password.' })
  .min(8, 'Use at least 8 characters.')
  .max(200, 'Use at most 200 characters.')

const email = z
  .string({ required_error: 'Enter an e-mail address.' })
  .trim()
  .toLowerCase()
  .min(1, 'Enter an e-mail address.')
  .max(254, 'Use at most 254 characters.')
  .email('Enter an e-mail address such as name@example.org.')

const displayName = z
  .string({ required_error: 'Enter the name to show to the people of your projects.' })
  .trim()
  .min(1, 'Enter the name to show to the people of your projects.')
  .max(80, 'Use at most 80 characters.')

export const registerSchema = z.object({ email, displayName, password }).strict()
export type RegisterInput = z.infer<typeof registerSchema>

export const signInSchema = z
  .object({
    email,
    password: z.string({ required_error: 'Enter your password.' }).min(1, 'Enter your password.').max(200),
  })
  .strict()
export type SignInInput = z.infer<typeof signInSchema>

export const changePasswordSchema = z
  .object({
    currentPassword: z
      .string({ required_error: 'Enter your current password.' })
      .min(1, 'Enter your current password.')
      .max(200),
    newPassword: password,
  })
  .strict()
export type ChangePasswordInput = z.infer<typeof changePasswordSchema>

export const TEMPERATURE_UNITS = ['celsius', 'fahrenheit'] as const
export const LENGTH_UNITS = ['metre', 'foot'] as const
export const GAUGE_UNITS = ['awg', 'square-millimetre'] as const

export const preferencesSchema = z
  .object({
    temperatureUnit: z.enum(TEMPERATURE_UNITS),
    lengthUnit: z.enum(LENGTH_UNITS),
    gaugeUnit: z.enum(GAUGE_UNITS),
  })
  .strict()
export type Preferences = z.infer<typeof preferencesSchema>
