import type { FigureWords } from '#shared/domain/findings'
import { compensationWords, jointKindWords } from '#shared/domain/findings'
import type { Indication, RunSection, Thermoelement, ThermocoupleRun } from '#shared/thermometry'
import { sameThermoelement, thermoelementInfo } from '#shared/thermometry'
import { heatStep } from './heat'
import { lineStyle } from './lineStyles'
import { namedParts } from './partNames'
import { partIdOf } from './partId'
import { straysAt } from './strays'
import type {
  ConductorModel,
  DisplayModel,
  RunModel,
  RunView,
  SectionModel,
  StationModel,
  ZoneModel,
} from './types'

function conductor(element: Thermoelement, wrong: boolean): ConductorModel {
  return { symbol: thermoelementInfo(element).symbol, style: lineStyle(element), wrong }
}

/** A zone with its temperature in the chosen state. */
export function zoneModel(view: RunView, key: string, figures: FigureWords): ZoneModel {
  const celsius = view.conditions.zoneCelsius[key] ?? 0
  return {
    key,
    name: view.zones[key]?.name ?? key,
    temperature: figures.temperature(celsius),
    heat: heatStep(celsius),
  }
}

/** The alloys that belong at a part, in either leg: a swapped pair is of the right alloys all the same. */
function intendedAlloys(view: RunView, partId: string): Thermoelement[] {
  const found = view.solution.contributions.find(({ place }) => partIdOf(place) === partId)
  return found ? [found.intended.positive, found.intended.negative] : []
}

function isAmong(alloys: readonly Thermoelement[], element: Thermoelement): boolean {
  return alloys.some((alloy) => sameThermoelement(alloy, element))
}

function sectionModel(view: RunView, section: RunSection, index: number, figures: FigureWords): SectionModel {
  const partId = partIdOf({ kind: 'section', sectionId: section.id })
  const found = view.solution.contributions.find(({ place }) => partIdOf(place) === partId)
  const metres = view.lengthsMetres?.[section.id] ?? null
  const reversed = found?.reversed ?? false
  const right = intendedAlloys(view, partId)
  return {
    partId,
    title: `${index + 1} ${section.label}`,
    length: metres === null ? null : figures.length(metres),
    adds:
      found === undefined || found.millivolts === null
        ? 'no figure'
        : figures.signedMillivolts(found.millivolts),
    conductors: {
      positive: conductor(section.positive, !isAmong(right, section.positive)),
      negative: conductor(section.negative, !isAmong(right, section.negative)),
    },
    reversed,
  }
}

function swappedPartIds(view: RunView): Set<string> {
  return new Set(
    view.solution.findings.flatMap((finding) =>
      finding.code === 'legs-swapped' ? finding.places.map(partIdOf) : [],
    ),
  )
}

function jointModels(view: RunView, figures: FigureWords): StationModel[] {
  const { joints, sections } = view.run
  const swapped = swappedPartIds(view)
  return joints.map((joint, index): StationModel => {
    const partId = partIdOf({ kind: 'joint', jointId: joint.id })
    const strays = straysAt(view, partId, figures)
    const right = intendedAlloys(view, partId)
    const metal = (leg: 'positive' | 'negative') => {
      const element = joint[`${leg}Metal`] ?? sections[index + 1]?.[leg] ?? 'Cu'
      // Between equal temperatures a foreign metal does no harm, and no colour is spent on it.
      return conductor(element, strays.length > 0 && !isAmong(right, element))
    }
    const hasLength = joint.positiveMetal !== null || joint.negativeMetal !== null
    return {
      partId,
      kind: joint.kind,
      label: joint.label || jointKindWords(joint.kind),
      crossed: joint.crossed,
      swapped: swapped.has(partId),
      metals: hasLength ? { positive: metal('positive'), negative: metal('negative') } : null,
      tipSideZone: zoneModel(view, joint.tipSideZone, figures),
      displaySideZone: zoneModel(view, joint.displaySideZone, figures),
      strays,
    }
  })
}

function terminalModel(view: RunView, figures: FigureWords): StationModel {
  const zone = zoneModel(view, view.run.terminals.zone, figures)
  return {
    partId: 'terminals',
    kind: 'terminals',
    label: 'Terminals',
    crossed: view.run.terminals.crossed,
    swapped: swappedPartIds(view).has('terminals'),
    metals: null,
    tipSideZone: zone,
    displaySideZone: zone,
    strays: straysAt(view, 'terminals', figures),
  }
}

/** What the display shows, in words as short as a display's. */
export function readingText(indication: Indication, figures: FigureWords): string {
  switch (indication.kind) {
    case 'value':
      return figures.temperature(indication.celsius)
    case 'off-scale-low':
      return 'Off scale, low'
    case 'off-scale-high':
      return 'Off scale, high'
    case 'withheld':
      return 'No figure'
  }
}

function displayModel(view: RunView, figures: FigureWords): DisplayModel {
  const { display, type }: ThermocoupleRun = view.run
  return {
    name: view.displayName,
    reading: readingText(view.solution.indication, figures),
    settings: [
      `Set to type ${display.typeSetting}`,
      compensationWords(display.compensation, figures.temperature),
    ],
    mismatch: display.typeSetting !== type,
  }
}

/** Puts a run, its zones and its solution into the words and figures of a drawing. */
export function runModel(view: RunView, figures: FigureWords): RunModel {
  const model = {
    tipZone: zoneModel(view, view.run.tipZone, figures),
    sections: view.run.sections.map((section, index) => sectionModel(view, section, index, figures)),
    stations: [...jointModels(view, figures), terminalModel(view, figures)],
    display: displayModel(view, figures),
  }
  return { ...model, parts: namedParts(view, model, figures) }
}
