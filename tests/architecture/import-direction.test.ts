import { describe, expect, it } from 'vitest'
import { RULES, violations } from './support/rules'
import { sourcesBelow } from './support/sources'

const sources = sourcesBelow(['app', 'server', 'shared'])

describe('imports point one way', () => {
  it.each(RULES)('$name', (rule) => {
    expect(sources.flatMap((file) => violations(rule, file))).toEqual([])
  })
})

describe('the rules notice', () => {
  const found = (path: string, text: string) =>
    RULES.flatMap((rule) => (violations(rule, { path, text }).length > 0 ? [rule.name] : []))

  it.each([
    ['shared/units/length.ts', "import { ref } from 'vue'"],
    ['shared/units/length.ts', "export * from '../../server/db/client'"],
    ['app/composables/useRun.ts', "import { db } from '~~/server/db/client'"],
    ['app/stores/run.ts', "const client = await import('../../server/db/client')"],
    ['server/services/run/read.ts', "import { useRun } from '~/composables/useRun'"],
    ['server/api/run.get.ts', "import { eq } from 'drizzle-orm'"],
    ['server/api/aircraft/[id]/run.get.ts', "import type { Row } from '../../../repositories/run'"],
    ['server/services/run/read.ts', "import handler from '~~/server/api/run.get'"],
    ['server/repositories/run.ts', "import { readRun } from '~~/server/services/run/read'"],
    ['server/db/client.ts', "import { findRun } from '../repositories/run'"],
    [
      'app/components/run/RunSum.vue',
      '<script setup lang="ts">\nimport { solveRun } from \'#shared/thermometry\'\n</script>',
    ],
    ['app/pages/bench.vue', "<script setup>\nimport * as physics from '#shared/thermometry'\n</script>"],
  ])('%s: %s', (path, text) => {
    expect(found(path, text)).toHaveLength(1)
  })

  it.each([
    ['shared/schemas/run.ts', "import { z } from 'zod'\nimport { LETTERS } from '../thermometry'"],
    ['app/composables/useRun.ts', "import { solveRun } from '#shared/thermometry'"],
    [
      'app/components/run/RunSum.vue',
      "<script setup lang=\"ts\">\nimport type { RunAnswer } from '#shared/thermometry'\nimport { LETTER_TYPES } from '#shared/thermometry'\n</script>",
    ],
    ['server/api/run.get.ts', "import { readRun } from '~~/server/services/run/read'"],
  ])('nothing wrong with %s: %s', (path, text) => {
    expect(found(path, text)).toEqual([])
  })
})
