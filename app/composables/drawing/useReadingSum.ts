import type { MaybeRefOrGetter } from 'vue'
import { jointKindWords } from '#shared/domain/findings'
import type { Contribution, RunSolution, ThermocoupleRun } from '#shared/thermometry'
import type { Figure } from '#shared/units'
import { NO_VALUE, millivoltFigure, signedMillivoltFigure } from '#shared/units'
import { partIdOf } from '~/drawing/run/partId'

/** A line of the sum. `total` lines stand under a rule. */
export interface SumRow {
  label: string
  figure: Figure
  partId: string | null
  total: boolean
}

const NONE: Figure = { value: NO_VALUE, unit: '' }

/** What a stretch of the run is called in a table. */
export function stretchLabel(run: ThermocoupleRun, { place }: Contribution): string {
  if (place.kind === 'section') {
    const index = run.sections.findIndex(({ id }) => id === place.sectionId)
    return `${index + 1} ${run.sections[index]?.label ?? ''}`
  }
  if (place.kind === 'joint') {
    const joint = run.joints.find(({ id }) => id === place.jointId)
    return joint ? joint.label || jointKindWords(joint.kind) : 'Joint'
  }
  return 'Display’s own copper'
}

function isWorthALine({ place, millivolts }: Contribution): boolean {
  return place.kind === 'section' || millivolts !== 0
}

/** The sum from tip to reading, line by line, in mV. */
export function useReadingSum(
  solved: MaybeRefOrGetter<{ run: ThermocoupleRun; solution: RunSolution }>,
  temperatureText: (celsius: number) => string,
) {
  return computed((): SumRow[] => {
    const { run, solution } = toValue(solved)
    const { terminalMillivolts, compensationMillivolts, compensationCelsius } = solution
    const signed = (millivolts: number | null) =>
      millivolts === null ? NONE : signedMillivoltFigure(millivolts)
    const plain = (millivolts: number | null) => (millivolts === null ? NONE : millivoltFigure(millivolts))
    const stretches = solution.contributions.filter(isWorthALine).map((contribution): SumRow => ({
      label: stretchLabel(run, contribution),
      figure: signed(contribution.millivolts),
      partId: partIdOf(contribution.place),
      total: false,
    }))
    const terminals: SumRow = {
      label: 'At the terminals',
      figure: plain(terminalMillivolts),
      partId: 'terminals',
      total: true,
    }
    if (run.display.compensation.kind === 'adds-degrees') return [...stretches, terminals]
    const converted =
      terminalMillivolts === null || compensationMillivolts === null
        ? null
        : terminalMillivolts + compensationMillivolts
    return [
      ...stretches,
      terminals,
      {
        label: `Cold-junction compensation for ${temperatureText(compensationCelsius)}, type ${run.display.typeSetting}`,
        figure: signed(compensationMillivolts),
        partId: 'display',
        total: false,
      },
      { label: 'Makes', figure: plain(converted), partId: 'display', total: true },
    ]
  })
}
