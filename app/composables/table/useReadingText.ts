import { FINDING_WORDS } from '#shared/domain/wording'
import type { ChannelRow } from '#shared/types/workbook'
import type { Indication } from '#shared/thermometry/run'
import { NO_VALUE } from '#shared/units'
import { useUnitsStore } from '~/stores/units'

/** Stored readings as text in the person's unit. */
export function useReadingText() {
  const units = useUnitsStore()

  function indicationText(indication: Indication): string {
    switch (indication.kind) {
      case 'value':
        return units.temperatureText(indication.celsius, 0)
      case 'off-scale-low':
        return 'off scale, low'
      case 'off-scale-high':
        return 'off scale, high'
      case 'withheld':
        return 'withheld'
    }
  }

  function readingText(row: ChannelRow, stateId: number): string {
    const reading = row.readings.find((candidate) => candidate.stateId === stateId)
    return reading ? indicationText(reading.indication) : NO_VALUE
  }

  /** The worst error over the states; empty when there is none to state. */
  function errorText(row: ChannelRow): string {
    const worst = row.readings.reduce<number | null>(
      (bad, { errorKelvin }) =>
        errorKelvin !== null && (bad === null || Math.abs(errorKelvin) > Math.abs(bad)) ? errorKelvin : bad,
      null,
    )
    return worst === null ? '' : units.differenceText(worst)
  }

  function findingText(row: ChannelRow): string {
    return [...new Set(row.findingCodes)].map((code) => FINDING_WORDS[code]).join(', ')
  }

  return { indicationText, readingText, errorText, findingText }
}
