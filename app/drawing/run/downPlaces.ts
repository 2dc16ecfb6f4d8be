import { textWidth, wrapText } from '../text'
import type { Label } from './primitives'
import { label } from './primitives'
import type { StationPlace, TrackPlaces } from './track'
import { pillWidth, swapText } from './track'
import type { RunModel, SectionModel, StationModel, StrayModel, ZoneModel } from './types'

export const DOWN_WIDTH = 358
export const POSITIVE_X = 42
export const NEGATIVE_X = 98
/** Text stands to the right of the conductors, in one column. */
const TEXT_X = 142
const TEXT_ROOM = DOWN_WIDTH - TEXT_X - 8
const LINE = 15
const CROSSING = 40
/** From where a joint begins to its first contact. */
const CONTACT = 14

/** What has been laid out so far, top to bottom. */
export interface DownLayout {
  y: number
  zone: string
  labels: Label[]
  /** Where a zone begins. */
  zones: { zone: ZoneModel; y: number }[]
  sections: TrackPlaces['sections'][number][]
  stations: StationPlace[]
  /** Top and bottom of each part by id. */
  reach: Map<string, readonly [number, number]>
}

function write(
  layout: DownLayout,
  lines: readonly string[],
  options: Parameters<typeof label>[2] = {},
): void {
  layout.labels.push(...label(lines, { x: TEXT_X, y: layout.y + 12 }, options))
  layout.y += lines.length * LINE
}

/** Begins a zone: its name, and its temperature at the right edge. */
function enterZone(layout: DownLayout, zone: ZoneModel): void {
  if (layout.zone === zone.key) return
  layout.zone = zone.key
  layout.zones.push({ zone, y: layout.y })
  layout.y += 6
  const room = TEXT_ROOM - textWidth(zone.temperature, 12) - 10
  const edge = { x: DOWN_WIDTH - 8, y: layout.y + 12 }
  layout.labels.push(...label([zone.temperature], edge, { anchor: 'end' }))
  write(layout, wrapText(zone.name, 12, room, 2), { strong: true })
  layout.y += 6
}

function strayLine({ drawnLeg, microvolts, degrees }: StrayModel): string {
  const sign = drawnLeg === 'positive' ? '+' : '−'
  return `▲ ${sign}\u00a0leg ${microvolts}${degrees === null ? '' : `, ${degrees}`}`
}

function writeStrays(layout: DownLayout, station: StationModel, side: StrayModel['side']): void {
  const lines = station.strays.filter((stray) => stray.side === side).map(strayLine)
  write(layout, lines, { tone: 'trouble', strong: true })
}

function placeSection(layout: DownLayout, section: SectionModel, next: StationModel): void {
  const from = layout.y
  layout.y += 10
  write(layout, wrapText(section.title, 12, TEXT_ROOM, 2), { strong: true })
  const figures = [...(section.length === null ? [] : [section.length]), section.adds].join(', ')
  write(layout, [figures], {})
  layout.y = Math.max(layout.y + 10, from + 64)
  const pillAt = (from + layout.y) / 2
  enterZone(layout, next.tipSideZone)
  // The conductors begin at the last contact, wherever the text of that joint ends.
  const start = layout.stations.at(-1)?.displaySide ?? from
  const end = next.crossed ? layout.y : layout.y + CONTACT
  layout.sections.push({ from: start, to: end, pillAt })
  layout.reach.set(section.partId, [from, layout.y])
}

function placeStation(layout: DownLayout, station: StationModel): void {
  const from = layout.y
  const tipSide = from + (station.crossed ? CROSSING : 0) + CONTACT
  layout.y += 4
  write(layout, wrapText(station.label, 12, TEXT_ROOM, 2))
  const swap = swapText(station)
  write(layout, swap === null ? [] : [swap], { tone: station.swapped ? 'trouble' : 'ink', strong: true })
  writeStrays(layout, station, 'tip-side')
  if (!station.metals) {
    layout.y = Math.max(layout.y + 6, tipSide + 16, from + 44)
    layout.stations.push({ from, tipSide, displaySide: tipSide })
  } else {
    const between = station.displaySideZone.key === layout.zone ? 0 : 10
    layout.y = Math.max(layout.y, tipSide + between)
    enterZone(layout, station.displaySideZone)
    writeStrays(layout, station, 'display-side')
    const displaySide = Math.max(layout.y - 6, tipSide + 50)
    layout.y = displaySide + 20
    layout.stations.push({ from, tipSide, displaySide })
  }
  layout.reach.set(station.partId, [from, layout.y])
}

function stagger(model: RunModel): number {
  const widest = Math.max(
    ...model.sections
      .flatMap(({ conductors }) => [conductors.positive.symbol, conductors.negative.symbol])
      .map(pillWidth),
    ...model.stations
      .flatMap(({ metals }) => (metals ? [metals.positive.symbol, metals.negative.symbol] : []))
      .map(pillWidth),
  )
  return widest > NEGATIVE_X - POSITIVE_X - 4 ? 11 : 0
}

/** Lays the parts of a run out from top to bottom, text beside them. */
export function downPlaces(model: RunModel): { layout: DownLayout; places: TrackPlaces } {
  const layout: DownLayout = {
    y: 0,
    zone: '',
    labels: [],
    zones: [],
    sections: [],
    stations: [],
    reach: new Map(),
  }
  enterZone(layout, model.tipZone)
  const tip = layout.y + 8
  write(layout, ['Tip'])
  layout.y = tip + 36
  layout.reach.set('tip', [tip - 8, layout.y])
  model.sections.forEach((section, index) => {
    const next = model.stations[index]
    if (!next) return
    placeSection(layout, section, next)
    placeStation(layout, next)
  })
  const { sections, stations } = layout
  const places = {
    tip,
    sections,
    stations,
    positive: POSITIVE_X,
    negative: NEGATIVE_X,
    stagger: stagger(model),
  }
  return { layout, places }
}
