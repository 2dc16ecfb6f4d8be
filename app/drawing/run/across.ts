import { wrapText } from '../text'
import {
  acrossPlaces,
  DISPLAY_WIDTH,
  NEGATIVE_Y,
  POSITIVE_Y,
  stationLines,
  strayAnchor,
  strayLines,
} from './acrossPlaces'
import { zoneStretches } from './bands'
import type { Label, Primitives, RunGeometry } from './primitives'
import { label, together } from './primitives'
import type { StationPlace, TrackPlaces } from './track'
import { ACROSS, drawTrack, swapText } from './track'
import type { RunModel, StationModel } from './types'

const HEIGHT = 362
/** Below this the sheet is bare, for dimensions and captions. */
const ZONES_HEIGHT = 276
const DIMENSION_Y = 288
/** Baseline of the last line of a joint's name. */
const NAMES_Y = 109
const STRAY_POSITIVE_Y = 129
const STRAY_NEGATIVE_Y = 256
const CAPTION_Y = 307

function drawZones(model: RunModel, places: TrackPlaces, width: number): Partial<Primitives> {
  const stretches = zoneStretches(model, places, width)
  return {
    bands: stretches.map(({ zone, from, to }) => ({
      key: zone.key,
      heat: zone.heat,
      box: { x: from, y: 0, width: to - from, height: ZONES_HEIGHT },
    })),
    dividers: stretches
      .slice(1)
      .map(({ from }) => ({ from: { x: from, y: 0 }, to: { x: from, y: ZONES_HEIGHT } })),
    labels: stretches.flatMap(({ zone, from, to }) => {
      const lines = wrapText(zone.name, 12, to - from - 16, 2)
      const x = from + 8
      return [
        ...label(lines, { x, y: 18 }, { strong: true }),
        ...label([zone.temperature], { x, y: 19 + lines.length * 14 }),
      ]
    }),
  }
}

function stationLabels(station: StationModel, place: StationPlace): Label[] {
  const centre = (place.from + place.displaySide) / 2
  const swap = swapText(station)
  const lines = stationLines(station)
  const nameY = NAMES_Y - (swap === null ? 0 : 14) - (lines.length - 1) * 14
  const anchor = 'middle'
  return [
    ...label(lines, { x: centre, y: nameY }, { anchor }),
    ...label(
      swap === null ? [] : [swap],
      { x: centre, y: NAMES_Y },
      { anchor, tone: swapTone(station), strong: true },
    ),
    ...station.strays.flatMap((stray) => {
      const side = strayAnchor(station, stray)
      const middle = (place.tipSide + place.displaySide) / 2
      const x =
        side === 'middle' ? middle : side === 'start' ? middle + 5 : middle - (station.metals ? 5 : 12)
      const y = stray.drawnLeg === 'positive' ? STRAY_POSITIVE_Y : STRAY_NEGATIVE_Y
      return label(strayLines(stray), { x, y }, { size: 11, anchor: side, tone: 'trouble', strong: true })
    }),
  ]
}

function swapTone({ swapped }: StationModel): 'trouble' | 'ink' {
  return swapped ? 'trouble' : 'ink'
}

function sectionLabels(model: RunModel, places: TrackPlaces): Label[] {
  return model.sections.flatMap((section, index) => {
    const place = places.sections[index]
    if (!place) return []
    const x = index === 0 ? (places.tip + place.to) / 2 : (place.from + place.to) / 2
    const width = index === 0 ? place.to - places.tip : place.to - place.from
    const lines = wrapText(section.title, 12, width - 6, 2)
    const y = CAPTION_Y + lines.length * 14
    const figures = [...(section.length === null ? [] : [section.length]), section.adds]
    return [
      ...label(lines, { x, y: CAPTION_Y }, { anchor: 'middle', strong: true }),
      ...label(figures, { x, y }, { anchor: 'middle' }),
    ]
  })
}

function dimensions({ tip, sections }: TrackPlaces): Primitives['dimensions'] {
  return sections.map(({ from, to }, index) => ({
    from: { x: index === 0 ? tip : from, y: DIMENSION_Y },
    to: { x: to, y: DIMENSION_Y },
  }))
}

function drawDisplay(model: RunModel, terminals: number): Partial<Primitives> {
  const { name, reading, settings, mismatch } = model.display
  const x = terminals + 30
  const room = DISPLAY_WIDTH - 38
  const names = wrapText(name, 12, room, 2)
  const [type = '', compensation = ''] = settings
  const readingY = POSITIVE_Y - 10 + names.length * 14
  return {
    displays: [
      { x: terminals, y: POSITIVE_Y - 46, width: DISPLAY_WIDTH, height: NEGATIVE_Y - POSITIVE_Y + 86 },
    ],
    labels: [
      ...label(names, { x, y: POSITIVE_Y - 26 }, { strong: true }),
      ...label([reading], { x, y: readingY }, { size: 17, strong: true }),
      ...label([type], { x, y: readingY + 22 }, { tone: mismatch ? 'trouble' : 'ink', strong: mismatch }),
      ...label(wrapText(compensation, 12, room, 3), { x, y: readingY + 37 }),
      ...label(['+'], { x: terminals + 18, y: POSITIVE_Y + 5 }, { size: 15, strong: true, anchor: 'middle' }),
      ...label(['−'], { x: terminals + 18, y: NEGATIVE_Y + 5 }, { size: 15, strong: true, anchor: 'middle' }),
    ],
  }
}

function areas(model: RunModel, places: TrackPlaces): Primitives['areas'] {
  const terminals = places.stations.at(-1)?.displaySide ?? 0
  const reach = new Map<string, readonly [number, number]>([
    ['tip', [places.tip - 22, places.tip + 24]],
    ['display', [terminals + 16, terminals + DISPLAY_WIDTH]],
    ...model.sections.map(({ partId }, index): [string, readonly [number, number]] => {
      const { from = 0, to = 0 } = places.sections[index] ?? {}
      return [partId, [from + 16, to - 16]]
    }),
    ...model.stations.map(({ partId }, index): [string, readonly [number, number]] => {
      const { from = 0, displaySide = 0 } = places.stations[index] ?? {}
      return [partId, [from - 14, displaySide + 14]]
    }),
  ])
  return model.parts.flatMap(({ id, words }) => {
    const [from, to] = reach.get(id) ?? [0, 0]
    const box = { x: from, y: POSITIVE_Y - 18, width: to - from, height: NEGATIVE_Y - POSITIVE_Y + 36 }
    return [{ partId: id, words, box }]
  })
}

/** The run lying across the sheet: hot end left, terminals right. */
export function drawAcross(model: RunModel): RunGeometry {
  const { places, width } = acrossPlaces(model)
  const terminals = places.stations.at(-1)?.displaySide ?? 0
  const primitives = together([
    drawZones(model, places, width),
    ...drawTrack(model, places, ACROSS),
    {
      labels: [
        ...label(['Tip'], { x: places.tip, y: NAMES_Y }, { anchor: 'middle' }),
        ...model.stations.flatMap((station, index) => {
          const place = places.stations[index]
          return place ? stationLabels(station, place) : []
        }),
        ...sectionLabels(model, places),
      ],
    },
    drawDisplay(model, terminals),
    { dimensions: dimensions(places), areas: areas(model, places) },
  ])
  return { ...primitives, orientation: 'across', width, height: HEIGHT }
}
