import { textWidth } from '../text'
import type { Box, Point, Primitives } from './primitives'
import type { ConductorModel, DrawnLegs, RunModel, SectionModel, StationModel } from './types'

/** Where the parts of a run lie along it, tip to display. */
export interface TrackPlaces {
  tip: number
  sections: readonly { from: number; to: number; pillAt: number }[]
  stations: readonly StationPlace[]
  /** Across the run. */
  positive: number
  negative: number
  /** Half of how far apart along the run the symbols of the two conductors stand, where side by side is too tight. */
  stagger: number
}

export interface StationPlace {
  /** Where the crossing begins; the first contact where there is none. */
  from: number
  /** The contact to the section on the tip side. */
  tipSide: number
  /** The contact to the section on the display side; the same where the conductors meet directly. */
  displaySide: number
}

/** Turns distance along and across the run into a point on paper. */
export type Axes = (along: number, across: number) => Point

export const ACROSS: Axes = (along, across) => ({ x: along, y: across })
export const DOWN: Axes = (along, across) => ({ x: across, y: along })

const PILL_SIZE = 11
const LEGS = ['positive', 'negative'] as const

/** Width of the symbol on a conductor, with its frame. */
export function pillWidth(symbol: string): number {
  return textWidth(symbol, PILL_SIZE) + 12
}

function at(point: Point): string {
  return `${round(point.x)} ${round(point.y)}`
}

function round(value: number): number {
  return Math.round(value * 100) / 100
}

function pill(partId: string, { symbol, wrong }: ConductorModel, centre: Point): Primitives['pills'][number] {
  const width = pillWidth(symbol)
  return { partId, text: symbol, wrong, box: { x: centre.x - width / 2, y: centre.y - 9, width, height: 18 } }
}

function pills(
  partId: string,
  faces: DrawnLegs<ConductorModel>,
  along: number,
  places: TrackPlaces,
  axes: Axes,
) {
  return LEGS.map((leg) => {
    const shift = leg === 'positive' ? -places.stagger : places.stagger
    return pill(partId, faces[leg], axes(along + shift, places[leg]))
  })
}

function drawSection(
  section: SectionModel,
  index: number,
  places: TrackPlaces,
  axes: Axes,
): Partial<Primitives> {
  const place = places.sections[index]
  if (!place) return {}
  const middle = (places.positive + places.negative) / 2
  const wires = LEGS.map((leg) => {
    const start = index === 0 ? `M${at(axes(places.tip, middle))} L` : 'M'
    const path = `${start}${at(axes(place.from, places[leg]))} L${at(axes(place.to, places[leg]))}`
    const { style, wrong } = section.conductors[leg]
    return { partId: section.partId, path, style, wrong }
  })
  return { wires, pills: pills(section.partId, section.conductors, place.pillAt, places, axes) }
}

function drawCrossing(
  station: StationModel,
  before: SectionModel,
  place: StationPlace,
  { positive, negative }: TrackPlaces,
  axes: Axes,
): Partial<Primitives> {
  if (!station.crossed) return {}
  const middle = (place.from + place.tipSide) / 2
  const curve = (from: number, to: number) =>
    `M${at(axes(place.from, from))} C${at(axes(middle, from))} ${at(axes(middle, to))} ${at(axes(place.tipSide, to))}`
  const { conductors } = before
  return {
    crossings: [
      {
        partId: station.partId,
        paths: [curve(negative, positive), curve(positive, negative)],
        styles: [conductors.negative.style, conductors.positive.style],
        swapped: station.swapped,
      },
    ],
  }
}

function bodyBox(place: StationPlace, places: TrackPlaces, axes: Axes): Box {
  const from = axes(place.tipSide - 14, places.positive - 16)
  const to = axes(place.displaySide + 14, places.negative + 16)
  return { x: from.x, y: from.y, width: to.x - from.x, height: to.y - from.y }
}

function drawStation(
  station: StationModel,
  index: number,
  model: RunModel,
  places: TrackPlaces,
  axes: Axes,
): Partial<Primitives> {
  const { partId, kind, metals } = station
  const place = places.stations[index]
  const before = model.sections[index]
  if (!place || !before) return {}
  const contacts = metals ? [place.tipSide, place.displaySide] : [place.tipSide]
  const pins = LEGS.map((leg) => ({
    partId,
    path: `M${at(axes(place.tipSide, places[leg]))} L${at(axes(place.displaySide, places[leg]))}`,
    style: metals?.[leg].style ?? before.conductors[leg].style,
    wrong: metals?.[leg].wrong ?? false,
  }))
  return {
    ...drawCrossing(station, before, place, places, axes),
    wires: metals ? pins : [],
    bodies: kind === 'terminals' ? [] : [{ partId, kind, box: bodyBox(place, places, axes) }],
    rings: contacts.flatMap((along) => LEGS.map((leg) => ({ partId, ...axes(along, places[leg]) }))),
    pills: metals ? pills(partId, metals, (place.tipSide + place.displaySide) / 2, places, axes) : [],
    marks: station.strays.map((stray) => {
      const along = stray.side === 'tip-side' ? place.tipSide : place.displaySide
      return { partId, ...axes(along, places[stray.drawnLeg]) }
    }),
  }
}

/** Draws what is the same whichever way the run lies: conductors, crossings, contacts, symbols, marks. */
export function drawTrack(model: RunModel, places: TrackPlaces, axes: Axes): Partial<Primitives>[] {
  const middle = (places.positive + places.negative) / 2
  return [
    { beads: [axes(places.tip, middle)] },
    ...model.sections.map((section, index) => drawSection(section, index, places, axes)),
    ...model.stations.map((station, index) => drawStation(station, index, model, places, axes)),
  ]
}

/** The words under which a crossing or a swap stands at its station; null where there is neither. */
export function swapText({ crossed, swapped }: StationModel): string | null {
  if (swapped) return 'legs swapped'
  return crossed ? 'crossed' : null
}
