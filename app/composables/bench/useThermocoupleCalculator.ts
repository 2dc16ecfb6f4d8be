import { thermocoupleAnswer } from '#shared/domain/bench/thermocoupleAnswer'
import type { LetterType } from '#shared/thermometry'
import { LETTER_TYPES, letterTypeRange, ThermometryError } from '#shared/thermometry'
import type { ThermocoupleAnswer } from '#shared/types/bench'
import { parseNumber } from '#shared/units'

type Given = 'celsius' | 'millivolts'

export interface CalculatorState {
  type: LetterType
  given: Given
  celsius: number | null
  millivolts: number | null
  coldJunctionCelsius: number | null
}

function queryText(value: unknown): string {
  return typeof value === 'string' ? value : ''
}

function fromQuery(query: Record<string, unknown>): CalculatorState {
  const type = LETTER_TYPES.find((letter) => letter === query.type) ?? 'K'
  const millivolts = parseNumber(queryText(query.millivolts))
  return {
    type,
    given: millivolts === null ? 'celsius' : 'millivolts',
    celsius: parseNumber(queryText(query.celsius)) ?? 300,
    millivolts,
    coldJunctionCelsius: parseNumber(queryText(query.coldJunctionCelsius)) ?? 0,
  }
}

interface Outcome {
  answer: ThermocoupleAnswer | null
  refusal: string
}

function workOut(state: CalculatorState): Outcome {
  const value = state[state.given]
  const { coldJunctionCelsius } = state
  if (
    value === null ||
    coldJunctionCelsius === null ||
    Number.isNaN(value) ||
    Number.isNaN(coldJunctionCelsius)
  )
    return { answer: null, refusal: 'Enter a number in each field.' }
  try {
    const question = { type: state.type, coldJunctionCelsius, [state.given]: value }
    return { answer: thermocoupleAnswer(question), refusal: '' }
  } catch (error) {
    if (error instanceof ThermometryError) return { answer: null, refusal: error.message }
    throw error
  }
}

/** The thermocouple calculator; its state stands in the address, so that a result can be linked to. */
export function useThermocoupleCalculator() {
  const route = useRoute()
  const router = useRouter()
  const state = reactive(fromQuery(route.query))
  const outcome = computed(() => workOut(state))
  const ranges = computed(() => letterTypeRange(state.type))

  const query = computed(() => {
    const value = state[state.given]
    return {
      type: state.type,
      ...(value === null || Number.isNaN(value) ? {} : { [state.given]: String(value) }),
      ...(state.coldJunctionCelsius ? { coldJunctionCelsius: String(state.coldJunctionCelsius) } : {}),
    }
  })
  watch(query, (next) => router.replace({ query: next }))

  return {
    state,
    types: LETTER_TYPES,
    ranges,
    answer: computed(() => outcome.value.answer),
    refusal: computed(() => outcome.value.refusal),
  }
}
