import { figureWords } from '#shared/domain/findings'
import { useUnitsStore } from '~/stores/units'

/** Figures as text, in the units the person chose. */
export function useFigureWords() {
  const units = useUnitsStore()
  return computed(() => figureWords({ temperatureUnit: units.temperatureUnit, lengthUnit: units.lengthUnit }))
}
