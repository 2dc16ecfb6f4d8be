import { describe, expect, it } from 'vitest'
import { functionsOf } from './support/declarations'
import { sourcesBelow } from './support/sources'

const WANTED_SHARE = 0.95

describe('docstrings', () => {
  it('stand on at least 95 % of the exported functions of shared/', () => {
    const exported = sourcesBelow(['shared'], ['.ts'])
      .flatMap(functionsOf)
      .filter(({ isExported }) => isExported)
    const missing = exported.filter(({ hasDocstring }) => !hasDocstring)
    const list = missing.map(({ path, name }) => `${path}: ${name}`).join('\n')
    const allowed = Math.floor(exported.length * (1 - WANTED_SHARE))
    expect(missing.length, `without a docstring:\n${list}`).toBeLessThanOrEqual(allowed)
  })

  it('are told from plain comments and found on both ways of writing a function', () => {
    const text = `
      /** Says so. */
      export function documented() {}
      // Says nothing to an editor.
      export function commented() {}
      /** Says so too. */
      export const arrow = () => 1
      function internal() {}
    `
    const facts = functionsOf({ path: 'shared/example.ts', text })
    expect(facts.map(({ name, isExported, hasDocstring }) => [name, isExported, hasDocstring])).toEqual([
      ['documented', true, true],
      ['commented', true, false],
      ['arrow', true, true],
      ['internal', false, false],
    ])
  })
})
