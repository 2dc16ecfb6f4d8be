import { textWidth, wrapText } from '../text'
import type { StationPlace, TrackPlaces } from './track'
import { pillWidth, swapText } from './track'
import type { RunModel, SectionModel, StationModel, StrayModel } from './types'

/** The full width of a drawing that has room to spare. */
const SHEET_WIDTH = 880
export const DISPLAY_WIDTH = 164
export const POSITIVE_Y = 166
export const NEGATIVE_Y = 226

const TIP_AT = 28
const FIRST_SECTION_AT = 54
const CROSSING = 46
const GAP = 14
const MARGIN = 8

/** Lines of a joint's name. */
export function stationLines({ label }: StationModel): string[] {
  return wrapText(label, 12, 116, 2)
}

/** The two lines of a stray junction. */
export function strayLines({ microvolts, degrees }: StrayModel): string[] {
  return degrees === null ? [microvolts] : [microvolts, degrees]
}

/** How a stray junction's figures stand to the middle of its joint. */
export function strayAnchor(station: StationModel, stray: StrayModel): 'start' | 'middle' | 'end' {
  if (station.kind === 'terminals') return 'end'
  if (!station.metals) return 'middle'
  return stray.side === 'tip-side' ? 'end' : 'start'
}

interface Extent {
  /** From where the crossing begins to the last contact. */
  core: number
  contact: number
  left: number
  right: number
}

function stationExtent(station: StationModel): Extent {
  const { metals, crossed } = station
  const contact = metals
    ? Math.max(pillWidth(metals.positive.symbol), pillWidth(metals.negative.symbol)) + 24
    : 0
  const core = contact + (crossed ? CROSSING : 0)
  const lines = [...stationLines(station), swapText(station) ?? '']
  const half = Math.max(core / 2 + 14, ...lines.map((line) => textWidth(line, 12) / 2))
  const strayWidth = (anchor: 'start' | 'end') =>
    Math.max(
      0,
      ...station.strays.map((stray) => {
        const width = Math.max(...strayLines(stray).map((line) => textWidth(line, 11)))
        const actual = strayAnchor(station, stray)
        if (actual === 'middle') return width / 2
        return actual === anchor ? width + 12 : 0
      }),
    )
  return {
    core,
    contact,
    left: Math.max(half, strayWidth('end')),
    right: Math.max(half, strayWidth('start')),
  }
}

/** A section's caption has two lines for its title. */
function sectionLength({ title, conductors }: SectionModel, before: Extent | null, after: Extent): number {
  const symbols = Math.max(pillWidth(conductors.positive.symbol), pillWidth(conductors.negative.symbol))
  const caption = Math.min(160, Math.max(84, textWidth(title, 12) / 2 + 20))
  const room = before ? before.right - before.core / 2 + after.left - after.core / 2 + GAP : 0
  return Math.max(symbols + 36, caption, room)
}

/** Lays the parts of a run out from left to right, filling the sheet where there is room. */
export function acrossPlaces(model: RunModel): { places: TrackPlaces; width: number } {
  const extents = model.stations.map(stationExtent)
  const lengths = model.sections.map((section, index) =>
    sectionLength(section, extents[index - 1] ?? null, extents[index] as Extent),
  )
  const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0)
  const needed =
    FIRST_SECTION_AT + sum(lengths) + sum(extents.map(({ core }) => core)) + DISPLAY_WIDTH + MARGIN
  const width = Math.max(SHEET_WIDTH, Math.ceil(needed))
  const more = (width - needed) / lengths.length
  let along = FIRST_SECTION_AT
  const stations: StationPlace[] = []
  const sections = lengths.map((length, index) => {
    const { core = 0, contact = 0 } = extents[index] ?? {}
    const from = along
    const to = from + length + more
    stations.push({ from: to, tipSide: to + core - contact, displaySide: to + core })
    along = to + core
    return { from, to, pillAt: (from + to) / 2 }
  })
  const places = { tip: TIP_AT, sections, stations, positive: POSITIVE_Y, negative: NEGATIVE_Y, stagger: 0 }
  return { places, width }
}
