import type { TableQuestion, TableRow } from '#shared/domain/bench/referenceTable'
import { referenceTable, refuseTable } from '#shared/domain/bench/referenceTable'
import type { LetterType } from '#shared/thermometry'
import { LETTER_TYPES, ThermometryError } from '#shared/thermometry'
import type { TemperatureUnit } from '#shared/units'
import { parseNumber } from '#shared/units'
import { useUnitsStore } from '~/stores/units'

interface TableState {
  type: LetterType
  unit: TemperatureUnit
  from: number | null
  to: number | null
  step: number | null
  coldJunction: number | null
}

const DEFAULTS = {
  celsius: { from: 0, to: 500, step: 1, coldJunction: 0 },
  fahrenheit: { from: 30, to: 1000, step: 2, coldJunction: 32 },
}

function fromQuery(query: Record<string, unknown>, preferred: TemperatureUnit): TableState {
  const unit = query.unit === 'celsius' || query.unit === 'fahrenheit' ? query.unit : preferred
  const number = (name: keyof (typeof DEFAULTS)['celsius']) => {
    const text = query[name]
    return (typeof text === 'string' ? parseNumber(text) : null) ?? DEFAULTS[unit][name]
  }
  return {
    type: LETTER_TYPES.find((letter) => letter === query.type) ?? 'K',
    unit,
    from: number('from'),
    to: number('to'),
    step: number('step'),
    coldJunction: number('coldJunction'),
  }
}

function complete(state: TableState): TableQuestion | null {
  const { from, to, step, coldJunction } = state
  const numbers = [from, to, step, coldJunction]
  if (numbers.some((value) => value === null || Number.isNaN(value))) return null
  return { ...state, from: from ?? 0, to: to ?? 0, step: step ?? 0, coldJunction: coldJunction ?? 0 }
}

function workOut(state: TableState): { rows: TableRow[]; refusal: string } {
  const question = complete(state)
  if (!question) return { rows: [], refusal: 'Enter a number in each field.' }
  const refusal = refuseTable(question)
  if (refusal) return { rows: [], refusal: refusal.reason }
  try {
    return { rows: referenceTable(question), refusal: '' }
  } catch (error) {
    if (error instanceof ThermometryError) return { rows: [], refusal: error.message }
    throw error
  }
}

/** A reference table whose settings stand in the address. */
export function useReferenceTable() {
  const route = useRoute()
  const router = useRouter()
  const units = useUnitsStore()
  const state = reactive(fromQuery(route.query, units.temperatureUnit))
  const outcome = computed(() => workOut(state))
  watch(
    state,
    (now) =>
      router.replace({
        query: Object.fromEntries(Object.entries(now).map(([name, value]) => [name, String(value)])),
      }),
    { deep: true },
  )

  /** Another unit starts from that unit's own round numbers. */
  function useUnit(unit: TemperatureUnit): void {
    Object.assign(state, { unit, ...DEFAULTS[unit] })
  }

  return {
    state,
    useUnit,
    rows: computed(() => outcome.value.rows),
    refusal: computed(() => outcome.value.refusal),
  }
}
