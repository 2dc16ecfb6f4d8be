import { describe, expect, it } from 'vitest'
import { describeCause, describeFindings, figureWords, runNames } from '#shared/domain/findings'
import { CAUSE_KINDS, solveRun } from '#shared/thermometry/run'
import type { RunFixture } from '../../../fixtures/runs'
import {
  copperExtension,
  displaySetToJ,
  rightRun,
  sixSections,
  swappedBothEnds,
} from '../../../fixtures/runs'

const figures = figureWords({ temperatureUnit: 'celsius', lengthUnit: 'metre' })

function tell({ run, states }: RunFixture) {
  return describeFindings(solveRun(run, states[0]).findings, runNames(run), figures)
}

describe('describeFindings', () => {
  it('has nothing to say of a right run', () => {
    expect(tell(rightRun())).toEqual({ groups: [], cautions: [] })
  })

  it('puts both legs of one place under one heading and says what to do once', () => {
    const { groups } = tell(copperExtension())
    expect(groups.map(({ titles }) => titles.length)).toEqual([2, 2])
    expect(groups.map(({ whatToDo }) => whatToDo.length)).toEqual([1, 1])
    expect(groups[1]?.explanations).toHaveLength(2)
    expect(groups[1]?.place).toEqual({ kind: 'joint', jointId: 'plug' })
  })

  it('says that a copper extension lacks the difference between its ends', () => {
    expect(tell(copperExtension()).groups[0]?.explanations.join(' ')).toContain('lacks about the difference')
  })

  it('reads every caution once', () => {
    const { cautions } = tell(copperExtension())
    expect(new Set(cautions).size).toBe(cautions.length)
    expect(cautions.length).toBeGreaterThan(1)
  })

  it('places a swap where it begins, and what the display does at the display', () => {
    expect(tell(swappedBothEnds()).groups[0]?.place).toEqual({ kind: 'joint', jointId: 'plug' })
    expect(tell(displaySetToJ()).groups[0]?.place).toEqual({ kind: 'display' })
  })

  it('puts faults before notes', () => {
    const fixture = sixSections()
    const display = { ...fixture.run.display, typeSetting: 'J' as const }
    const { groups } = tell({ ...fixture, run: { ...fixture.run, display } })
    expect(groups.map(({ severity }) => severity)).toEqual(['fault', 'note'])
  })
})

describe('describeCause', () => {
  const names = runNames(copperExtension().run)

  it.each(CAUSE_KINDS)('has words for %s', (kind) => {
    const cause = { kind, place: { kind: 'display' } as const, microvolts: null, kelvin: 1 }
    expect(describeCause(cause, names)).toMatch(/^[A-Z]\S+/)
  })

  it('names the place, unless it is the display', () => {
    const place = { kind: 'section', sectionId: 'extension' } as const
    expect(describeCause({ kind: 'conductors', place, microvolts: -1772, kelvin: -44 }, names)).toBe(
      'Other alloy: section 2, “Hook-up wire”',
    )
  })
})
