import type { Channel, ExpectedReading } from '#shared/types/workbook'

/** A channel whose expected reading is no longer what it was. */
export interface MovedChannel {
  channelId: number
  tag: string
  /** What was shown before, °C; null where it was off scale, withheld or not there. */
  beforeCelsius: number | null
  afterCelsius: number | null
}

function shownCelsius(reading: ExpectedReading | undefined): number | null {
  return reading?.indication.kind === 'value' ? reading.indication.celsius : null
}

/** Compares what is shown in one operating state before and after a write, in the order of the channels. */
export function movedChannels(
  stateId: number,
  channels: readonly Channel[],
  before: readonly ExpectedReading[],
  after: readonly ExpectedReading[],
): MovedChannel[] {
  const inState = (readings: readonly ExpectedReading[]) =>
    new Map(readings.filter((one) => one.stateId === stateId).map((one) => [one.channelId, one]))
  const [was, is] = [inState(before), inState(after)]
  return channels
    .map(({ id, tag }) => ({
      channelId: id,
      tag,
      beforeCelsius: shownCelsius(was.get(id)),
      afterCelsius: shownCelsius(is.get(id)),
    }))
    .filter(({ beforeCelsius, afterCelsius }) => beforeCelsius !== afterCelsius)
}
