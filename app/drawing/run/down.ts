import { wrapText } from '../text'
import type { DownLayout } from './downPlaces'
import { DOWN_WIDTH, downPlaces, NEGATIVE_X, POSITIVE_X } from './downPlaces'
import type { Primitives, RunGeometry } from './primitives'
import { label, together } from './primitives'
import { DOWN, drawTrack } from './track'
import type { DisplayModel, RunModel } from './types'

const DISPLAY_X = 14
const TEXT_X = 142

function drawZones({ zones }: DownLayout, height: number): Partial<Primitives> {
  return {
    bands: zones.map(({ zone, y }, index) => ({
      key: zone.key,
      heat: zone.heat,
      box: { x: 0, y, width: DOWN_WIDTH, height: (zones[index + 1]?.y ?? height) - y },
    })),
    dividers: zones.slice(1).map(({ y }) => ({ from: { x: 0, y }, to: { x: DOWN_WIDTH, y } })),
  }
}

function drawDisplay(display: DisplayModel, top: number): { piece: Partial<Primitives>; bottom: number } {
  const room = DOWN_WIDTH - TEXT_X - DISPLAY_X - 8
  const names = wrapText(display.name, 12, room, 2)
  const [type = '', compensation = ''] = display.settings
  const details = wrapText(compensation, 12, room, 3)
  const readingY = top + 20 + names.length * 15 + 6
  const height = readingY - top + 22 + details.length * 15 + 14
  const sign = (text: string, x: number) =>
    label([text], { x, y: top + 30 }, { size: 15, strong: true, anchor: 'middle' })
  const tone = display.mismatch ? 'trouble' : 'ink'
  return {
    bottom: top + height,
    piece: {
      displays: [{ x: DISPLAY_X, y: top, width: DOWN_WIDTH - DISPLAY_X - 8, height }],
      labels: [
        ...sign('+', POSITIVE_X),
        ...sign('−', NEGATIVE_X),
        ...label(names, { x: TEXT_X, y: top + 20 }, { strong: true }),
        ...label([display.reading], { x: TEXT_X, y: readingY }, { size: 17, strong: true }),
        ...label([type], { x: TEXT_X, y: readingY + 21 }, { tone, strong: display.mismatch }),
        ...label(details, { x: TEXT_X, y: readingY + 36 }),
      ],
    },
  }
}

/** The run hanging down a narrow sheet: hot end on top, terminals at the bottom. */
export function drawDown(model: RunModel): RunGeometry {
  const { layout, places } = downPlaces(model)
  const terminals = layout.stations.at(-1)?.displaySide ?? layout.y
  const top = Math.max(layout.y, terminals + 16)
  const { piece, bottom } = drawDisplay(model.display, top)
  const height = bottom + 12
  const tails = [POSITIVE_X, NEGATIVE_X].map((x) => ({
    partId: 'terminals',
    path: `M${x} ${terminals} L${x} ${top + 14}`,
    style: { weight: 1.5, dashes: null },
    wrong: false,
  }))
  layout.reach.set('display', [top, bottom])
  const areas = model.parts.map(({ id, words }) => {
    const [from, to] = layout.reach.get(id) ?? [0, 0]
    return { partId: id, words, box: { x: 2, y: from, width: DOWN_WIDTH - 4, height: to - from } }
  })
  const primitives = together([
    drawZones(layout, height),
    { wires: tails },
    ...drawTrack(model, places, DOWN),
    { labels: layout.labels },
    piece,
    { areas },
  ])
  return { ...primitives, orientation: 'down', width: DOWN_WIDTH, height }
}
