import { describe, expect, it } from 'vitest'
import {
  addJoint,
  cableOf,
  canAddJoint,
  changeJoint,
  changeSection,
  conductorsOf,
  crossBothEnds,
  crossLegs,
  defaultRun,
  removeJoint,
} from '#shared/domain/runDraft'
import { wiringRunSchema } from '#shared/schemas/run'

const zones = [
  { key: '1', name: 'Exhaust 1', kind: 'exhaust' },
  { key: '2', name: 'Engine bay', kind: 'engine-bay' },
  { key: '3', name: 'Cabin', kind: 'cabin' },
] as const

function ids() {
  let count = 0
  return () => `p${++count}`
}

function fresh() {
  const newId = ids()
  return { run: defaultRun('K', zones, newId), newId }
}

describe('a run being drawn up', () => {
  it('begins as probe, plug pair in the engine bay, extension: a run the schema takes', () => {
    const { run } = fresh()
    expect(wiringRunSchema.parse(run)).toEqual(run)
    expect(run.joints[0]?.tipSideZone).toBe('2')
    expect(run.sections.map(({ positive, negative }) => [positive, negative])).toEqual([
      ['KP', 'KN'],
      ['KP', 'KN'],
    ])
  })

  it('takes a joint within a section and gives it up again', () => {
    const { run, newId } = fresh()
    const extension = run.sections[1]?.id ?? ''
    const longer = addJoint(run, extension, '3', newId)
    expect(wiringRunSchema.safeParse(longer).success).toBe(true)
    expect(longer.sections).toHaveLength(3)
    expect(longer.joints.map(({ tipSideZone }) => tipSideZone)).toEqual(['2', '3'])
    const back = removeJoint(longer, longer.joints[1]?.id ?? '')
    expect(back).toEqual(run)
  })

  it('adds lengths up when a joint goes, and leaves the given run as it was', () => {
    const { run } = fresh()
    const measured = changeSection(run, run.sections[1]?.id ?? '', { lengthMetres: 3 })
    expect(removeJoint(measured, run.joints[0]?.id ?? '').sections[0]?.lengthMetres).toBe(3.5)
    expect(run.sections).toHaveLength(2)
  })

  it('stops at the largest run the product takes', () => {
    const { run, newId } = fresh()
    let long = run
    for (let i = 0; i < 30; i++) long = addJoint(long, long.sections[0]?.id ?? '', '2', newId)
    expect(long.sections).toHaveLength(16)
    expect(canAddJoint(long)).toBe(false)
    expect(wiringRunSchema.safeParse(long).success).toBe(true)
  })

  it('gives a joint between two zones a contact metal', () => {
    const { run } = fresh()
    const wall = changeJoint(run, run.joints[0]?.id ?? '', { displaySideZone: '3' })
    expect(wall.joints[0]).toMatchObject({ positiveMetal: 'Cu', negativeMetal: 'Cu' })
    expect(wiringRunSchema.safeParse(wall).success).toBe(true)
  })

  it('crosses legs at a joint, at the terminals, and a pair at both its ends', () => {
    const { run } = fresh()
    expect(crossLegs(run, run.joints[0]?.id ?? '').joints[0]?.crossed).toBe(true)
    expect(crossLegs(run, null).terminals.crossed).toBe(true)
    const both = crossBothEnds(run, run.sections[1]?.id ?? '')
    expect([both.joints[0]?.crossed, both.terminals.crossed]).toEqual([true, true])
    expect(crossBothEnds(both, run.sections[1]?.id ?? '')).toEqual(run)
    expect(crossBothEnds(run, run.sections[0]?.id ?? '')).toBe(run)
  })

  it('leaves a run alone when the part is not in it', () => {
    const { run, newId } = fresh()
    expect(addJoint(run, 'none', '2', newId)).toBe(run)
    expect(removeJoint(run, 'none')).toBe(run)
    expect(crossLegs(run, 'none')).toBe(run)
  })
})

describe('cables', () => {
  it('are known by their pair and the other way round', () => {
    expect(cableOf('KP', 'KN')).toBe('K')
    expect(cableOf('EP', 'EN')).toBe('E')
    expect(cableOf('Cu', 'TP')).toBe('copper')
    expect(cableOf('KN', 'KP')).toBe('other')
    expect(cableOf('Cu', 'KN')).toBe('other')
    expect(conductorsOf('J')).toEqual({ positive: 'JP', negative: 'JN' })
    expect(conductorsOf('copper')).toEqual({ positive: 'Cu', negative: 'Cu' })
    expect(conductorsOf('other')).toBeNull()
  })
})
