import type { ContactShare, EmfPath, Leg } from '#shared/thermometry'
import type { ShownUnits } from '#shared/domain/findings'
import type { LineStyle } from '../run/lineStyles'
import type { Box, Point } from '../run/primitives'

/** What the emf-against-temperature plot is made from. */
export interface EmfPlotView {
  path: EmfPath
  contactShares: readonly ContactShare[]
  /** Section before each joint, by joint id: a joint without length is known by the contact of that section. */
  sectionBefore: Readonly<Record<string, string>>
  lastSection: string
}

export interface PlotSize {
  width: number
  height: number
  units: Pick<ShownUnits, 'temperatureUnit'>
}

export interface Tick {
  at: number
  text: string
}

export interface PlotStroke {
  partId: string
  leg: Leg
  path: string
  style: LineStyle
}

export interface PlotText extends Point {
  text: string
  anchor: 'start' | 'middle' | 'end'
}

export interface EmfPlotGeometry {
  width: number
  height: number
  /** Where the axes enclose the curves. */
  frame: Box
  temperatureTicks: Tick[]
  emfTicks: Tick[]
  strokes: PlotStroke[]
  intended: string | null
  contacts: (Point & { partId: string })[]
  /** Contacts of stray junctions. */
  marks: (Point & { partId: string })[]
  tip: Point
  /** The emf at the terminals as a dimension: from one open end to the other. */
  voltage: { x: number; start: Point; end: Point; millivolts: number; textAt: Point }
  symbols: PlotText[]
}
