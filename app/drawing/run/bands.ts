import type { TrackPlaces } from './track'
import type { RunModel, ZoneModel } from './types'

/** A stretch of the run in one zone. */
export interface Stretch {
  zone: ZoneModel
  from: number
  to: number
}

interface Stop {
  zone: ZoneModel
  /** How far the parts at this stop reach along the run. */
  from: number
  to: number
}

function stops(model: RunModel, places: TrackPlaces): Stop[] {
  const tip = { zone: model.tipZone, from: places.tip, to: places.sections[0]?.from ?? places.tip }
  const others = model.stations.flatMap((station, index): Stop[] => {
    const place = places.stations[index]
    if (!place) return []
    const { tipSideZone, displaySideZone } = station
    return [
      { zone: tipSideZone, from: place.from, to: place.tipSide },
      { zone: displaySideZone, from: place.displaySide, to: place.displaySide },
    ]
  })
  return [tip, ...others]
}

/** Divides the run into zones: one gives way to the next halfway between the parts that lie in them. */
export function zoneStretches(model: RunModel, places: TrackPlaces, end: number): Stretch[] {
  const stretches: Stretch[] = []
  let reached = 0
  for (const stop of stops(model, places)) {
    const last = stretches.at(-1)
    if (last?.zone.key === stop.zone.key) last.to = end
    else {
      const from = last ? (reached + stop.from) / 2 : 0
      if (last) last.to = from
      stretches.push({ zone: stop.zone, from, to: end })
    }
    reached = stop.to
  }
  return stretches
}
