import { describe, expect, it } from 'vitest'
import { STAGES, chooseStages } from '../../../scripts/lib/testing/stages.mjs'

const names = (parameters: string[]) => chooseStages(parameters).stages.map(({ name }) => name)

describe('choosing stages', () => {
  it('runs all of them by default, the build before what needs it', () => {
    const all = names([])
    expect(all).toEqual(STAGES.map(({ name }) => name))
    expect(all.indexOf('build')).toBeLessThan(all.indexOf('integration'))
    expect(all.indexOf('build')).toBeLessThan(all.indexOf('e2e'))
  })

  it('runs the chosen ones in their usual order', () => {
    expect(names(['--only', 'unit,lint'])).toEqual(['lint', 'unit'])
  })

  it('adds the build that a chosen stage needs', () => {
    expect(names(['--only', 'e2e'])).toEqual(['build', 'e2e'])
  })

  it('passes the rest on to the runners', () => {
    const chosen = chooseStages(['--only', 'unit', '--', 'tests/unit/a.test.ts'])
    expect(chosen.passedOn).toEqual(['tests/unit/a.test.ts'])
  })

  it.each([[['--only', 'unti']], [['--only']], [['unit']], [['--only', 'unit', 'lint']]])(
    'refuses %j',
    (given) => {
      expect(() => chooseStages(given)).toThrow(/not understood/)
    },
  )
})
