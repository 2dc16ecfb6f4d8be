import type { MaybeRefOrGetter } from 'vue'
import type { EmfPath, RunSolution, ThermocoupleRun } from '#shared/thermometry'
import { emfPlotGeometry } from '~/drawing/plot/emfPlot'
import type { EmfPlotView } from '~/drawing/plot/types'
import { useUnitsStore } from '~/stores/units'

interface PlottedRun {
  run: ThermocoupleRun
  solution: RunSolution
  path: EmfPath | null
}

const WIDE = { width: 880, height: 380 }
const NARROW = { width: 358, height: 340 }

/** The emf-against-temperature plot for wide and narrow sheets; null where the run's data do not reach. */
export function useEmfPlot(plotted: MaybeRefOrGetter<PlottedRun>) {
  const units = useUnitsStore()
  return computed(() => {
    const { run, solution, path } = toValue(plotted)
    if (!path) return null
    const view: EmfPlotView = {
      path,
      contactShares: solution.contactShares,
      sectionBefore: Object.fromEntries(
        run.joints.map(({ id }, index) => [id, run.sections[index]?.id ?? '']),
      ),
      lastSection: run.sections.at(-1)?.id ?? '',
    }
    const size = { units: { temperatureUnit: units.temperatureUnit } }
    return {
      wide: emfPlotGeometry(view, { ...WIDE, ...size }),
      narrow: emfPlotGeometry(view, { ...NARROW, ...size }),
    }
  })
}
