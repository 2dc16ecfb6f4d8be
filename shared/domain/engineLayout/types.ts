import type { Quantity } from '../../schemas/aircraft'
import type { Sensor } from '../../schemas/channel'
import type { ZoneKind } from '../../schemas/zone'
import type { LetterType } from '../../thermometry/its90'

/** A zone before it has a row of its own; other parts of the lay-out name it by `key`. */
export interface LaidOutZone {
  key: string
  name: string
  kind: ZoneKind
}

export interface LaidOutState {
  name: string
  /** Suggested temperature of every zone, °C by zone key. */
  zoneCelsius: Readonly<Record<string, number>>
}

export interface LaidOutChannel {
  tag: string
  quantity: Quantity
  cylinder: number | null
  sensor: Sensor
  /** Planned type and, to begin with, the type the display input is set to; thermocouples only. */
  thermocoupleType: LetterType | null
  tipZone: string | null
  inputNumber: number
}

/** Everything a new aircraft begins with. */
export interface EngineLayOut {
  zones: readonly LaidOutZone[]
  states: readonly LaidOutState[]
  channels: readonly LaidOutChannel[]
  display: { inputs: number; terminalZone: string }
}
