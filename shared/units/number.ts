/** Shown where a figure is missing. */
export const NO_VALUE = '–'

/**
 * A number with fixed decimals and a true minus sign. Never shows a negative zero.
 *
 * @param decimals 0 to 9
 */
export function formatNumber(value: number, decimals: number): string {
  const text = Math.abs(value).toFixed(decimals)
  const isZero = Number(text) === 0
  return value < 0 && !isZero ? `−${text}` : text
}

/** As `formatNumber`, with a plus sign before what is above zero. */
export function formatSigned(value: number, decimals: number): string {
  const text = formatNumber(value, decimals)
  return value > 0 && Number(text) !== 0 ? `+${text}` : text
}

/**
 * Reads a number as people write it: stray spaces, decimal comma, any minus sign.
 *
 * @returns null when the text is no number
 */
export function parseNumber(text: string): number | null {
  const plain = text
    .replace(/[\s\u00a0\u202f]/g, '')
    .replace(/[−–]/, '-')
    .replace(',', '.')
  return /^[+-]?(\d+\.?\d*|\.\d+)$/.test(plain) ? Number(plain) : null
}
