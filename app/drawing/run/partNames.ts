import type { FigureWords } from '#shared/domain/findings'
import { jointKindWords } from '#shared/domain/findings'
import type { PartModel, RunModel, RunView, SectionModel, StationModel, StrayModel, ZoneModel } from './types'

type Unnamed = Omit<RunModel, 'parts'>

function zoneWords({ name, temperature }: ZoneModel): string {
  return `${name} ${temperature}`
}

function strayWords(stray: StrayModel): string {
  const degrees = stray.degrees === null ? '' : `, ${stray.degrees}`
  return `stray junction on the ${stray.drawnLeg} conductor: ${stray.microvolts}${degrees}`
}

function sectionWords(model: Unnamed, section: SectionModel, index: number, label: string): string {
  const from = model.stations[index - 1]?.displaySideZone ?? model.tipZone
  const to = model.stations[index]?.tipSideZone ?? model.tipZone
  const { positive, negative } = section.conductors
  const told = (face: SectionModel['conductors']['positive'], leg: string) =>
    `${face.symbol} ${leg}${face.wrong ? ' (wrong alloy)' : ''}`
  return [
    `Section ${index + 1}, ${label}: ${told(positive, 'positive')}`,
    told(negative, 'negative'),
    ...(section.length === null ? [] : [section.length]),
    ...(section.reversed ? ['legs swapped'] : []),
    `from ${zoneWords(from)} to ${zoneWords(to)}`,
    section.adds === 'no figure' ? 'no figure for what it adds' : `adds ${section.adds}`,
  ].join(', ')
}

function stationWords(station: StationModel): string {
  const { kind, label, metals, tipSideZone, displaySideZone } = station
  const kindWords = kind === 'terminals' ? 'display terminals' : jointKindWords(kind)
  const isSaidByLabel = label.toLowerCase().includes(kindWords)
  const named = kind === 'terminals' ? kindWords : isSaidByLabel ? label : `${kindWords}, ${label}`
  const where =
    tipSideZone.key === displaySideZone.key
      ? `in ${zoneWords(tipSideZone)}`
      : `from ${zoneWords(tipSideZone)} to ${zoneWords(displaySideZone)}`
  return [
    `${named.charAt(0).toUpperCase()}${named.slice(1)}: ${where}`,
    ...(metals ? [`contacts ${metals.positive.symbol} positive, ${metals.negative.symbol} negative`] : []),
    ...(station.crossed ? ['conductors crossed'] : []),
    ...(station.swapped ? ['legs swapped here'] : []),
    ...station.strays.map(strayWords),
  ].join(', ')
}

/** Every part of the run in words, tip to display. */
export function namedParts(view: RunView, model: Unnamed, figures: FigureWords): PartModel[] {
  const tip: PartModel = {
    id: 'tip',
    words: `Tip: in ${model.tipZone.name} at ${figures.temperature(view.solution.tipCelsius)}`,
  }
  const along = model.sections.flatMap((section, index): PartModel[] => {
    const station = model.stations[index]
    const label = view.run.sections[index]?.label ?? ''
    return [
      { id: section.partId, words: sectionWords(model, section, index, label) },
      ...(station ? [{ id: station.partId, words: stationWords(station) }] : []),
    ]
  })
  const { name, reading, settings } = model.display
  const display: PartModel = {
    id: 'display',
    words: `Display, ${name}: ${settings.join(', ')}, shows ${reading}`,
  }
  return [tip, ...along, display]
}
