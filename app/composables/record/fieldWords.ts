import { NO_VALUE } from '#shared/units'

/** A field's name as words: `workingLowCelsius` reads "working low celsius". */
export function fieldWords(field: string): string {
  return field
    .replace(/Id$/, '')
    .replace(/([a-z])([A-Z])/g, '$1 $2')
    .toLowerCase()
}

function listed(values: readonly unknown[]): string {
  if (values.length === 0) return NO_VALUE
  const plain = values.every((value) => typeof value !== 'object')
  return plain ? values.map(String).join(', ') : String(values.length)
}

/** A stored value for reading: nothing is a dash, parts are told one after another. */
export function valueWords(value: unknown): string {
  if (value === null || value === undefined || value === '') return NO_VALUE
  if (typeof value === 'boolean') return value ? 'yes' : 'no'
  if (Array.isArray(value)) return listed(value)
  if (typeof value === 'object')
    return Object.entries(value)
      .map(([part, content]) => `${fieldWords(part)} ${valueWords(content)}`)
      .join(', ')
  return String(value)
}
