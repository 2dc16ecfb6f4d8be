import type { ThermocoupleQuery } from '#shared/schemas/bench'
import type { LetterType } from '#shared/thermometry'
import {
  celsiusFromMillivolts,
  emfMillivolts,
  letterTypeRange,
  OutOfRangeError,
  sensitivityMillivoltsPerKelvin,
} from '#shared/thermometry'
import type { ThermocoupleAnswer } from '#shared/types/bench'
import { AppError } from '~~/server/http/appError'

const SOURCE = 'ITS-90 reference functions, NIST Monograph 175'

/** Temperature to emf or back, for a thermocouple whose terminals are at the cold junction's temperature. */
export async function answerThermocouple(query: ThermocoupleQuery): Promise<ThermocoupleAnswer> {
  const { type, coldJunctionCelsius = 0 } = query
  const coldJunctionMillivolts = naming('coldJunctionCelsius', () => emfMillivolts(type, coldJunctionCelsius))
  const celsius = query.celsius ?? tipCelsius(type, query.millivolts ?? 0, coldJunctionMillivolts)
  const tipMillivolts = naming('celsius', () => emfMillivolts(type, celsius))
  return {
    type,
    celsius,
    coldJunctionCelsius,
    millivolts: query.millivolts ?? tipMillivolts - coldJunctionMillivolts,
    sensitivityMillivoltsPerKelvin: sensitivityMillivoltsPerKelvin(type, celsius),
    range: letterTypeRange(type),
    source: SOURCE,
  }
}

function tipCelsius(type: LetterType, terminalMillivolts: number, coldJunctionMillivolts: number): number {
  return naming('millivolts', () => celsiusFromMillivolts(type, terminalMillivolts + coldJunctionMillivolts))
}

/** Says which field of the request it was that lies out of range. */
function naming(field: string, compute: () => number): number {
  try {
    return compute()
  } catch (error) {
    if (!(error instanceof OutOfRangeError)) throw error
    throw new AppError('out-of-range', error.message, { errors: [{ field, reason: error.message }] })
  }
}
