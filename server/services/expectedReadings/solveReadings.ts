import { solveChannel } from '#shared/domain/channelRun'
import type { FindingCode, RunSolution } from '#shared/thermometry/run'
import type { Channel, Display, ExpectedReading, WiringRun, ZoneGrid } from '#shared/types/workbook'

/** Everything of one channel that its expected readings rest on, besides the zones of the aircraft. */
export interface ChannelRecords {
  channel: Channel
  display: Display | null
  run: WiringRun | null
}

/** What the channel should read in every operating state; empty while there is no circuit to solve. */
export function solveReadings({ channel, display, run }: ChannelRecords, grid: ZoneGrid): ExpectedReading[] {
  const solution = solveChannel(channel, display, run, grid)
  if (!solution) return []
  return solution.states.map(({ id, solution: solved }) => toReading(channel.id, Number(id), solved))
}

function toReading(channelId: number, stateId: number, solved: RunSolution): ExpectedReading {
  return {
    channelId,
    stateId,
    tipCelsius: solved.tipCelsius,
    terminalMillivolts: solved.terminalMillivolts,
    indication: solved.indication,
    errorKelvin: solved.errorKelvin,
    findingCodes: distinctCodes(solved),
  }
}

function distinctCodes({ findings }: RunSolution): FindingCode[] {
  return [...new Set(findings.map((finding) => finding.code))]
}
