import { describe, expect, it } from 'vitest'
import { functionsOf } from './support/declarations'
import { LIMITS, tooLong } from './support/limits'
import { folderSizes, sourcesBelow } from './support/sources'

const LONGEST_FUNCTION = 50
const FULLEST_FOLDER = 20
const CODE = ['app', 'server', 'shared', 'scripts']
// A composable or store is one function around others; the limit for the whole file holds there.
const WRAPPERS = /^app\/(composables|stores)\//

describe('sizes', () => {
  const files = sourcesBelow(CODE)

  it.each(LIMITS)('$kind has at most $lines lines', (limit) => {
    expect(tooLong(limit, files)).toEqual([])
  })

  it(`a function has at most ${LONGEST_FUNCTION} lines`, () => {
    const long = files
      .filter(({ path }) => !WRAPPERS.test(path))
      .flatMap(functionsOf)
      .filter(({ lines }) => lines > LONGEST_FUNCTION)
    expect(long.map(({ path, name, lines }) => `${path}: ${name} has ${lines} lines`)).toEqual([])
  })

  it(`a folder holds at most ${FULLEST_FOLDER} files`, () => {
    const full = folderSizes(CODE).filter((folder) => folder.files > FULLEST_FOLDER)
    expect(full.map((folder) => `${folder.path}: ${folder.files} files`)).toEqual([])
  })

  it.each([
    ['app/pages/aircraft/[id].vue', 120],
    ['app/components/run/RunDrawing.vue', 200],
    ['app/composables/useRun.ts', 150],
    ['server/api/health.get.ts', 50],
  ])('%s is measured against %i lines', (path, allowed) => {
    const found = (lines: number) =>
      LIMITS.flatMap((limit) => tooLong(limit, [{ path, text: 'x\n'.repeat(lines) }]))
    expect(found(allowed)).toEqual([])
    expect(found(allowed + 1)).toHaveLength(1)
  })
})
