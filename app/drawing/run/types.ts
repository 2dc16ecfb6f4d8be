import type { ZoneKind } from '#shared/schemas/zone'
import type { JointKind, Leg, RunConditions, RunSolution, ThermocoupleRun } from '#shared/thermometry'
import type { LineStyle } from './lineStyles'

/** A zone as it is shown. */
export interface ZoneFace {
  name: string
  kind: ZoneKind
}

/** Everything a drawing of a run is made from. */
export interface RunView {
  run: ThermocoupleRun
  /** By the keys the run uses. */
  zones: Readonly<Record<string, ZoneFace>>
  conditions: RunConditions
  solution: RunSolution
  displayName: string
  /** Metres by section id; a length that is not logged may be left out. */
  lengthsMetres?: Readonly<Record<string, number | null>>
}

/** 0 for the coldest tint of the heat ramp, 6 for the hottest. */
export type HeatStep = 0 | 1 | 2 | 3 | 4 | 5 | 6

export interface ZoneModel {
  key: string
  name: string
  temperature: string
  heat: HeatStep
}

/** A conductor of a leg as drawn. */
export interface ConductorModel {
  symbol: string
  style: LineStyle
  /** True where the alloy is not the one that belongs there. */
  wrong: boolean
}

/** Which of the two drawn conductors: as marked on the section, positive first. */
export type DrawnLegs<Value> = Record<Leg, Value>

/** A contact that is no business of the tip's, and what it adds. */
export interface StrayModel {
  /** The conductor of the drawing on which it sits. */
  drawnLeg: Leg
  side: 'tip-side' | 'display-side'
  microvolts: string
  /** Null where the display shows no value. */
  degrees: string | null
}

export interface SectionModel {
  partId: string
  title: string
  length: string | null
  adds: string
  conductors: DrawnLegs<ConductorModel>
  reversed: boolean
}

/** A place where conductors meet: a joint, or the display's terminals. */
export interface StationModel {
  partId: string
  kind: JointKind | 'terminals'
  label: string
  crossed: boolean
  /** True where legs are swapped here, by a crossing or by how the sections are marked. */
  swapped: boolean
  /** Null where the conductors meet directly. */
  metals: DrawnLegs<ConductorModel> | null
  tipSideZone: ZoneModel
  displaySideZone: ZoneModel
  strays: readonly StrayModel[]
}

export interface DisplayModel {
  name: string
  reading: string
  settings: readonly string[]
  mismatch: boolean
}

/** A part of the run that can be lit, with its name in words. */
export interface PartModel {
  id: string
  words: string
}

/** A run in the words and figures of a drawing, before anything has a place on paper. */
export interface RunModel {
  tipZone: ZoneModel
  sections: readonly SectionModel[]
  /** joints[i] follows sections[i]; the last one is the terminals. */
  stations: readonly StationModel[]
  display: DisplayModel
  /** Tip to display: the order in which they are read and reached by keyboard. */
  parts: readonly PartModel[]
}
