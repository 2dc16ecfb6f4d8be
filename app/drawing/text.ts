/** Widths of Inter in em, rounded up, so that what is measured here fits when it is drawn. */
const NARROW = /[ijl.,:;'’|!()[\]\u00a0 ]/
const WIDE = /[mwMWÅ@%]/
const CAPITAL = /[A-Z+−–—°µ“”0-9≠=]/

function emWidth(character: string): number {
  if (NARROW.test(character)) return 0.33
  if (WIDE.test(character)) return 0.92
  if (CAPITAL.test(character)) return 0.68
  return 0.6
}

/** Width of a line of text, in the unit of `size`. Errs on the wide side. */
export function textWidth(text: string, size: number): number {
  return [...text].reduce((sum, character) => sum + emWidth(character), 0) * size
}

function shorten(text: string, size: number, width: number): string {
  if (textWidth(text, size) <= width) return text
  const characters = [...text]
  while (characters.length > 1 && textWidth(`${characters.join('').trimEnd()}…`, size) > width)
    characters.pop()
  return `${characters.join('').trimEnd()}…`
}

/**
 * Breaks text into lines at its ordinary spaces (no-break spaces hold). What does not fit in `maxLines`
 * ends in an ellipsis.
 */
export function wrapText(text: string, size: number, width: number, maxLines: number): string[] {
  const words = text.split(' ').filter((word) => word !== '')
  const lines: string[] = []
  let line = ''
  for (const word of words) {
    const longer = line === '' ? word : `${line} ${word}`
    if (line === '' || textWidth(longer, size) <= width) line = longer
    else {
      lines.push(line)
      line = word
    }
  }
  if (line !== '') lines.push(line)
  const kept = lines.slice(0, maxLines)
  if (lines.length > maxLines) kept[maxLines - 1] = lines.slice(maxLines - 1).join(' ')
  return kept.map((text) => shorten(text, size, width))
}
