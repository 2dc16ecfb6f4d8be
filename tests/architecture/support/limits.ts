import type { SourceFile } from './sources'
import { lineCount } from './sources'

interface Limit {
  kind: string
  matches: RegExp
  lines: number
}

export const LIMITS: Limit[] = [
  { kind: 'a page', matches: /^app\/pages\/.*\.vue$/, lines: 120 },
  { kind: 'a component', matches: /^app\/(components|layouts)\/.*\.vue$/, lines: 200 },
  { kind: 'a composable or store', matches: /^app\/(composables|stores)\/.*\.ts$/, lines: 150 },
  { kind: 'an API route', matches: /^server\/api\/.*\.ts$/, lines: 50 },
]

/** The files of one kind that are longer than its limit. */
export function tooLong({ matches, lines }: Limit, files: SourceFile[]): string[] {
  return files
    .filter(({ path, text }) => matches.test(path) && lineCount(text) > lines)
    .map(({ path, text }) => `${path}: ${lineCount(text)} lines, ${lines} allowed`)
}
