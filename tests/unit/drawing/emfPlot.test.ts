import { describe, expect, it } from 'vitest'
import { emfPath, solveRun } from '#shared/thermometry'
import { emfPlotGeometry } from '~/drawing/plot/emfPlot'
import { overlap, placeSymbols } from '~/drawing/plot/symbols'
import type { RunFixture } from '../../fixtures/runs'
import { copperSplice, rightRun, RUN_FIXTURES, swappedAtTerminals } from '../../fixtures/runs'

const SIZES = { wide: { width: 880, height: 380 }, narrow: { width: 358, height: 340 } }

function plot(
  fixture: RunFixture,
  unit: 'celsius' | 'fahrenheit' = 'celsius',
  size: keyof typeof SIZES = 'wide',
) {
  const [conditions] = fixture.states
  const path = emfPath(fixture.run, conditions)
  if (!path) throw new Error('The fixture lies beyond the data of its conductors.')
  const solution = solveRun(fixture.run, conditions)
  const { joints, sections } = fixture.run
  const geometry = emfPlotGeometry(
    {
      path,
      contactShares: solution.contactShares,
      sectionBefore: Object.fromEntries(joints.map(({ id }, index) => [id, sections[index]?.id ?? ''])),
      lastSection: sections.at(-1)?.id ?? '',
    },
    { ...SIZES[size], units: { temperatureUnit: unit } },
  )
  return { geometry, solution }
}

describe.each(Object.entries(RUN_FIXTURES))('%s', (_, build) => {
  it('opens at the terminals by the emf of the run', () => {
    const { geometry, solution } = plot(build())
    expect(geometry.voltage.millivolts).toBeCloseTo(solution.terminalMillivolts ?? Number.NaN, 9)
    expect(geometry.voltage.start.x).toBeCloseTo(geometry.voltage.end.x, 1)
  })

  it.each(['wide', 'narrow'] as const)('keeps every curve within the %s frame', (size) => {
    const { geometry } = plot(build(), 'celsius', size)
    const { frame } = geometry
    const numbers = geometry.strokes.flatMap(({ path }) => path.match(/-?\d+(\.\d+)?/g)?.map(Number) ?? [])
    const xs = numbers.filter((_, index) => index % 2 === 0)
    const ys = numbers.filter((_, index) => index % 2 === 1)
    expect(Math.min(...xs)).toBeGreaterThanOrEqual(frame.x)
    expect(Math.max(...xs)).toBeLessThanOrEqual(frame.x + frame.width)
    expect(Math.min(...ys)).toBeGreaterThanOrEqual(frame.y)
    expect(Math.max(...ys)).toBeLessThanOrEqual(frame.y + frame.height)
  })
})

describe('axes', () => {
  it('carry nice figures of the unit shown', () => {
    const fahrenheit = plot(rightRun(), 'fahrenheit').geometry.temperatureTicks.map(({ text }) =>
      Number(text),
    )
    expect(fahrenheit).toContain(100)
    expect(fahrenheit.every((value) => value % 50 === 0)).toBe(true)
  })

  it('put the same curves in the same place whatever the unit', () => {
    expect(plot(rightRun(), 'fahrenheit').geometry.strokes).toEqual(plot(rightRun()).geometry.strokes)
  })
})

describe('marks', () => {
  it('none on a right run, whose path is the intended one', () => {
    const { geometry } = plot(rightRun())
    expect(geometry.marks).toEqual([])
    expect(geometry.intended).not.toBeNull()
  })

  it('stand on the path where the copper of a splice begins and ends', () => {
    const { geometry } = plot(copperSplice())
    expect(geometry.marks.map(({ partId }) => partId)).toEqual(['joint:hot', 'joint:cold'])
    for (const mark of geometry.marks)
      expect(geometry.contacts.some(({ x, y }) => x === mark.x && y === mark.y)).toBe(true)
  })
})

it('points down for a run that is swapped at the terminals', () => {
  const { start, end, millivolts } = plot(swappedAtTerminals()).geometry.voltage
  expect(millivolts).toBeLessThan(0)
  expect(end.y).toBeGreaterThan(start.y)
})

describe('placeSymbols', () => {
  const rising = (x: number, y: number) => [0, 1, 2].map((step) => ({ x: x + step * 50, y: y - step * 40 }))

  it('leaves out what is too short and what has no room', () => {
    const placed = placeSymbols([
      { text: 'KP', above: false, points: rising(100, 300) },
      { text: 'Cu', above: false, points: rising(101, 301) },
      { text: 'KN', above: true, points: [{ x: 0, y: 0 }] },
    ])
    expect(placed.map(({ text }) => text)).toHaveLength(1)
  })

  it('knows touching from overlapping', () => {
    const box = { x: 0, y: 0, width: 10, height: 10 }
    expect(overlap(box, { ...box, x: 10 })).toBe(false)
    expect(overlap(box, { ...box, x: 9 })).toBe(true)
  })
})
