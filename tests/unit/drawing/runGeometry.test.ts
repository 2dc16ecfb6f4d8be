import { describe, expect, it } from 'vitest'
import { figureWords } from '#shared/domain/findings'
import { solveRun } from '#shared/thermometry'
import type { Box, Label, RunGeometry } from '~/drawing/run/primitives'
import { runDrawings } from '~/drawing/run/runGeometry'
import type { RunView } from '~/drawing/run/types'
import type { RunFixture } from '../../fixtures/runs'
import {
  copperExtension,
  copperSplice,
  rightRun,
  RUN_FIXTURES,
  sixSections,
  swappedAtTerminals,
  swappedBothEnds,
} from '../../fixtures/runs'

const figures = figureWords({ temperatureUnit: 'celsius', lengthUnit: 'metre' })

function viewOf(fixture: RunFixture, stateIndex = 0): RunView {
  const conditions = fixture.states[stateIndex] ?? fixture.states[0]
  return { ...fixture, conditions, solution: solveRun(fixture.run, conditions) }
}

const draw = (fixture: RunFixture, stateIndex = 0) => runDrawings(viewOf(fixture, stateIndex), figures)

const sharesGround = (a: Box, b: Box) =>
  a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height

function collisions(boxes: readonly { what: string; box: Box }[]): string[] {
  return boxes.flatMap((one, index) =>
    boxes
      .slice(index + 1)
      .filter((other) => sharesGround(one.box, other.box))
      .map((other) => `${one.what} on ${other.what}`),
  )
}

const written = (labels: readonly Label[]) => labels.map(({ lines, box }) => ({ what: lines.join(' '), box }))

const cases = Object.entries(RUN_FIXTURES).flatMap(([name, build]) =>
  [0, 1, 3].flatMap((state) =>
    (['across', 'down'] as const).map((orientation) => ({ name, build, state, orientation })),
  ),
)

describe.each(cases)('$name, state $state, drawn $orientation', ({ build, state, orientation }) => {
  const geometry = draw(build(), state)[orientation]

  it('writes no label over another, nor over a symbol', () => {
    const pills = geometry.pills.map(({ text, box }) => ({ what: `symbol ${text}`, box }))
    expect(collisions([...written(geometry.labels), ...pills])).toEqual([])
  })

  it('keeps everything on the sheet', () => {
    const outside = written(geometry.labels).filter(
      ({ box }) =>
        box.x < 0 || box.y < 0 || box.x + box.width > geometry.width || box.y + box.height > geometry.height,
    )
    expect(outside.map(({ what }) => what)).toEqual([])
  })

  it('writes no label over a contact or a mark', () => {
    const points = [...geometry.rings, ...geometry.marks].map(({ x, y, partId }) => ({
      what: partId,
      box: { x: x - 5, y: y - 5, width: 10, height: 10 },
    }))
    const hit = written(geometry.labels).flatMap((text) =>
      points.filter(({ box }) => sharesGround(text.box, box)).map(({ what }) => `${text.what} on ${what}`),
    )
    expect(hit).toEqual([])
  })

  it('gives every part an area of its own, reached in order from tip to display', () => {
    const along = (area: RunGeometry['areas'][number]) => (orientation === 'across' ? area.box.x : area.box.y)
    const places = geometry.areas.map(along)
    expect(places).toEqual([...places].sort((a, b) => a - b))
    expect(collisions(geometry.areas.map(({ partId, box }) => ({ what: partId, box })))).toEqual([])
    expect(geometry.areas[0]?.partId).toBe('tip')
    expect(geometry.areas.at(-1)?.partId).toBe('display')
  })

  it('covers the run with zones without a gap', () => {
    const length = orientation === 'across' ? geometry.width : geometry.height
    const reach = geometry.bands.map(({ box }) => (orientation === 'across' ? box.width : box.height))
    expect(reach.reduce((sum, part) => sum + part, 0)).toBeCloseTo(length, 6)
    expect(Math.min(...reach)).toBeGreaterThan(20)
  })
})

describe('crossings', () => {
  it.each(Object.entries(RUN_FIXTURES))(
    'are drawn where the record says crossed, and only there: %s',
    (_, build) => {
      const fixture = build()
      const crossed = [
        ...fixture.run.joints.filter((joint) => joint.crossed).map(({ id }) => `joint:${id}`),
        ...(fixture.run.terminals.crossed ? ['terminals'] : []),
      ]
      const { across, down } = draw(fixture)
      expect(across.crossings.map(({ partId }) => partId)).toEqual(crossed)
      expect(down.crossings.map(({ partId }) => partId)).toEqual(crossed)
    },
  )

  it('change sides: the upper conductor arrives below', () => {
    const [crossing] = draw(swappedAtTerminals()).across.crossings
    expect(crossing?.paths[1]).toMatch(/^M\S+ 166 C.* 226$/)
    expect(crossing?.swapped).toBe(true)
  })
})

describe('stray junctions', () => {
  it('none on a right run', () => {
    expect(draw(rightRun()).across.marks).toEqual([])
  })

  it('sit on both display-side contacts of the plug of a copper extension', () => {
    const { across } = draw(copperExtension())
    const plug = across.rings.filter(({ partId }) => partId === 'joint:plug')
    const displaySide = Math.max(...plug.map(({ x }) => x))
    expect(across.marks.map(({ partId, x, y }) => [partId, x, y])).toEqual([
      ['joint:plug', displaySide, 166],
      ['joint:plug', displaySide, 226],
    ])
  })

  it('sit on the positive conductor alone where one leg is spliced', () => {
    const { across } = draw(copperSplice())
    expect(across.marks.map(({ partId, y }) => [partId, y])).toEqual([
      ['joint:hot', 166],
      ['joint:cold', 166],
    ])
  })

  it('follow the drawn conductor where the legs are exchanged further on', () => {
    const fixture = swappedBothEnds()
    const { solution } = viewOf(fixture)
    const marks = draw(fixture).across.marks.filter(({ partId }) => partId === 'joint:plug')
    expect(solution.contactShares.filter(({ place }) => place.kind === 'joint')).toHaveLength(marks.length)
    expect(new Set(marks.map(({ y }) => y))).toEqual(new Set([166, 226]))
  })

  it('give microvolts and degrees in the person’s unit', () => {
    const fahrenheit = figureWords({ temperatureUnit: 'fahrenheit', lengthUnit: 'foot' })
    const text = runDrawings(viewOf(copperSplice()), fahrenheit).across.labels.flatMap(({ lines }) => lines)
    expect(text.filter((line) => line.endsWith('µV')).length).toBe(2)
    expect(text).toContain('392.0\u00a0°F')
  })
})

describe('words of the parts', () => {
  const words = draw(copperExtension()).across.areas.map((area) => area.words)

  it('say what a section is, where it runs and what it adds', () => {
    expect(words[1]).toBe(
      'Section 1, Probe lead: KP positive, KN negative, 0.60\u00a0m, from Cylinder head 2 200.0\u00a0°C to Engine bay 72.0\u00a0°C, adds +5.204\u00a0mV',
    )
  })

  it('name a wrong alloy and its stray junctions', () => {
    expect(words[3]).toContain('Cu positive (wrong alloy), Cu negative (wrong alloy)')
    expect(words[2]).toMatch(
      /^Plug pair: in Engine bay 72\.0\u00a0°C, .*stray junction on the positive conductor: /,
    )
  })

  it('name both zones of a feed-through', () => {
    const feed = draw(sixSections()).down.areas.find(({ partId }) => partId === 'joint:firewall')
    expect(feed?.words).toContain('from Firewall, engine side 58.0\u00a0°C to Cabin 19.0\u00a0°C')
  })
})
