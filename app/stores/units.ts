import { defineStore } from 'pinia'
import type { Preferences } from '#shared/schemas/account'
import { preferencesSchema } from '#shared/schemas/account'
import type { Figure } from '#shared/units'
import {
  differenceFigure,
  figureText,
  gaugeFigure,
  lengthFigure,
  lengthSymbol,
  temperatureFigure,
  temperatureSymbol,
} from '#shared/units'

export const DEFAULT_PREFERENCES: Preferences = {
  temperatureUnit: 'celsius',
  lengthUnit: 'metre',
  gaugeUnit: 'awg',
}

/** The units a person reads in: the account's choice, or this browser's where nobody is signed in. */
export const useUnitsStore = defineStore('units', () => {
  const cookie = useCookie<Preferences | null>('cowlbook-units', {
    default: () => null,
    sameSite: 'lax',
    maxAge: 365 * 24 * 3600,
  })
  const stored = preferencesSchema.safeParse(cookie.value)
  const preferences = ref<Preferences>(stored.success ? stored.data : DEFAULT_PREFERENCES)

  const temperatureUnit = computed(() => preferences.value.temperatureUnit)
  const lengthUnit = computed(() => preferences.value.lengthUnit)
  const gaugeUnit = computed(() => preferences.value.gaugeUnit)

  /** Takes over a choice and keeps it in this browser. */
  function use(choice: Preferences): void {
    preferences.value = choice
    cookie.value = choice
  }

  const temperature = (celsius: number, decimals?: number): Figure =>
    temperatureFigure(celsius, temperatureUnit.value, decimals)
  const difference = (kelvin: number, decimals?: number): Figure =>
    differenceFigure(kelvin, temperatureUnit.value, decimals)
  const length = (metres: number): Figure => lengthFigure(metres, lengthUnit.value)
  const gauge = (awg: number): Figure => gaugeFigure(awg, gaugeUnit.value)

  return {
    preferences,
    temperatureUnit,
    lengthUnit,
    gaugeUnit,
    temperatureSymbol: computed(() => temperatureSymbol(temperatureUnit.value)),
    lengthSymbol: computed(() => lengthSymbol(lengthUnit.value)),
    use,
    temperature,
    difference,
    length,
    gauge,
    temperatureText: (celsius: number, decimals?: number) => figureText(temperature(celsius, decimals)),
    differenceText: (kelvin: number, decimals?: number) => figureText(difference(kelvin, decimals)),
  }
})
