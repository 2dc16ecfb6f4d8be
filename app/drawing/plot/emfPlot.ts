import type { ContactShare, EmfPoint, PathStretch } from '#shared/thermometry'
import { thermoelementInfo } from '#shared/thermometry'
import { formatNumber, fromCelsius, toCelsius } from '#shared/units'
import { lineStyle } from '../run/lineStyles'
import { partIdOf } from '../run/partId'
import type { Point } from '../run/primitives'
import type { Scale } from './scale'
import { atLeast, linearScale, niceTicks } from './scale'
import { placeSymbols } from './symbols'
import type { EmfPlotGeometry, EmfPlotView, PlotSize, PlotStroke, Tick } from './types'

const MARGIN = { left: 52, right: 16, top: 16, bottom: 44 }
/** Left of the coldest point, where the voltage at the terminals is written. */
const VOLTAGE_ROOM = 92
const NEGLIGIBLE_MICROVOLTS = 0.05

interface Scales {
  x: Scale
  y: Scale
}

function extent(values: readonly number[]): [number, number] {
  return [Math.min(...values), Math.max(...values)]
}

function allPoints({ path }: EmfPlotView): EmfPoint[] {
  return [...[...path.positive, ...path.negative].flatMap(({ points }) => points), ...(path.intended ?? [])]
}

function scalesFor(view: EmfPlotView, { width, height }: PlotSize): Scales {
  const points = allPoints(view)
  const [cold, hot] = atLeast(extent(points.map(({ celsius }) => celsius)), 10)
  const [low, high] = atLeast(extent([0, ...points.map(({ millivolts }) => millivolts)]), 0.2)
  const space = (high - low) * 0.08
  return {
    x: linearScale([cold, hot], [MARGIN.left + VOLTAGE_ROOM, width - MARGIN.right - 20]),
    y: linearScale([low - space, high + space], [height - MARGIN.bottom, MARGIN.top]),
  }
}

/** Ticks are nice numbers of the unit shown, wherever those lie in °C. */
function temperatureTicks({ x }: Scales, { width, units }: PlotSize): Tick[] {
  const unit = units.temperatureUnit
  const ends = [MARGIN.left, width - MARGIN.right].map((place) => fromCelsius(x.valueAt(place), unit))
  const { values, decimals } = niceTicks(ends[0] ?? 0, ends[1] ?? 0, Math.max(3, Math.floor(width / 90)))
  return values.map((value) => ({ at: x.place(toCelsius(value, unit)), text: formatNumber(value, decimals) }))
}

function emfTicks({ y }: Scales, { height }: PlotSize): Tick[] {
  const [low, high] = [y.valueAt(height - MARGIN.bottom), y.valueAt(MARGIN.top)]
  const { values, decimals } = niceTicks(low, high, 7)
  return values.map((value) => ({ at: y.place(value), text: formatNumber(value, decimals) }))
}

function pointAt({ x, y }: Scales, { celsius, millivolts }: EmfPoint): Point {
  return { x: Math.round(x.place(celsius) * 100) / 100, y: Math.round(y.place(millivolts) * 100) / 100 }
}

function line(scales: Scales, points: readonly EmfPoint[]): string {
  return points
    .map((point, index) => {
      const { x, y } = pointAt(scales, point)
      return `${index === 0 ? 'M' : 'L'}${x} ${y}`
    })
    .join(' ')
}

function strokes(view: EmfPlotView, scales: Scales): PlotStroke[] {
  return (['positive', 'negative'] as const).flatMap((leg) =>
    view.path[leg].map(({ place, conductor, points }) => ({
      partId: partIdOf(place),
      leg,
      path: line(scales, points),
      style: lineStyle(conductor),
    })),
  )
}

/** The stretch whose display end a contact is. */
function stretchOf(view: EmfPlotView, share: ContactShare): PathStretch | undefined {
  const { place, side, leg } = share
  const jointEnd = place.kind === 'joint' && side === 'display-side'
  const before = place.kind === 'joint' ? view.sectionBefore[place.jointId] : view.lastSection
  const wanted = jointEnd ? partIdOf(place) : `section:${before}`
  return view.path[leg].find((stretch) => partIdOf(stretch.place) === wanted)
}

function marks(view: EmfPlotView, scales: Scales): EmfPlotGeometry['marks'] {
  return view.contactShares
    .filter(({ place, microvolts }) => place.kind !== 'tip' && Math.abs(microvolts) >= NEGLIGIBLE_MICROVOLTS)
    .flatMap((share) => {
      const points = stretchOf(view, share)?.points ?? []
      // The positive leg is walked from the display, the negative one towards it.
      const point = share.leg === 'positive' ? points[0] : points.at(-1)
      return point ? [{ partId: partIdOf(share.place), ...pointAt(scales, point) }] : []
    })
}

function contacts({ path }: EmfPlotView, scales: Scales): EmfPlotGeometry['contacts'] {
  const ends = [
    ...path.positive.slice(1).map(({ place, points }) => ({ place, point: points[0] })),
    ...path.negative.slice(0, -1).map(({ place, points }) => ({ place, point: points.at(-1) })),
  ]
  return ends.flatMap(({ place, point }) =>
    point ? [{ partId: partIdOf(place), ...pointAt(scales, point) }] : [],
  )
}

function voltage({ path }: EmfPlotView, scales: Scales): EmfPlotGeometry['voltage'] {
  const first = path.positive[0]?.points[0] ?? { celsius: 0, millivolts: 0 }
  const last = path.negative.at(-1)?.points.at(-1) ?? first
  const [start, end] = [pointAt(scales, first), pointAt(scales, last)]
  const x = MARGIN.left + 14
  // Too short a dimension has no room for its figure between the arrows.
  const tight = Math.abs(end.y - start.y) < 34
  const y = tight ? Math.min(start.y, end.y) - 8 : (start.y + end.y) / 2 + 4
  return { x, start, end, millivolts: last.millivolts - first.millivolts, textAt: { x: x + 8, y } }
}

/**
 * Places the walk + terminal → tip → − terminal on paper, emf against temperature.
 * Sizes in drawing units, which are CSS pixels at full size.
 */
export function emfPlotGeometry(view: EmfPlotView, size: PlotSize): EmfPlotGeometry {
  const { width, height } = size
  const scales = scalesFor(view, size)
  const stretches = [...view.path.positive, ...view.path.negative]
  const tip = view.path.positive.at(-1)?.points.at(-1) ?? { celsius: 0, millivolts: 0 }
  return {
    width,
    height,
    frame: {
      x: MARGIN.left,
      y: MARGIN.top,
      width: width - MARGIN.left - MARGIN.right,
      height: height - MARGIN.top - MARGIN.bottom,
    },
    temperatureTicks: temperatureTicks(scales, size),
    emfTicks: emfTicks(scales, size),
    strokes: strokes(view, scales),
    intended: view.path.intended && line(scales, view.path.intended),
    contacts: contacts(view, scales),
    marks: marks(view, scales),
    tip: pointAt(scales, tip),
    voltage: voltage(view, scales),
    symbols: placeSymbols(
      stretches.map(({ conductor, points }, index) => ({
        text: thermoelementInfo(conductor).symbol,
        above: index >= view.path.positive.length,
        points: points.map((point) => pointAt(scales, point)),
      })),
    ),
  }
}
