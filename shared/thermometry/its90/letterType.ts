/** Letter-designated thermocouple types (IEC 60584-1, ASTM E230). */
export const LETTER_TYPES = ['B', 'E', 'J', 'K', 'N', 'R', 'S', 'T'] as const
export type LetterType = (typeof LETTER_TYPES)[number]
