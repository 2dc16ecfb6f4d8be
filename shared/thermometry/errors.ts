/** Anything the physics refuses. `code` is stable; the message is for the person. */
export class ThermometryError extends Error {
  readonly code: string

  constructor(code: string, message: string) {
    super(message)
    this.name = 'ThermometryError'
    this.code = code
  }
}

/** A limit as it is printed: whole degrees stay whole, emf limits need no more than 0.1 µV. */
function printed(limit: number): number {
  return Number(limit.toFixed(4))
}

/** A value outside the range in which the published data hold. */
export class OutOfRangeError extends ThermometryError {
  constructor(
    /** What was out of range, e.g. `type K temperature`. */
    readonly what: string,
    readonly value: number,
    readonly low: number,
    readonly high: number,
    readonly unit: '°C' | 'mV',
    reason = '',
  ) {
    super(
      'out-of-range',
      `The ${what} ${value} ${unit} is outside its range, ${printed(low)} to ${printed(high)} ${unit}.${reason ? ` ${reason}` : ''}`,
    )
    this.name = 'OutOfRangeError'
  }
}

/** A value that is no finite number. */
export class NotANumberError extends ThermometryError {
  constructor(readonly what: string) {
    super('not-a-number', `The ${what} must be a finite number.`)
    this.name = 'NotANumberError'
  }
}

/**
 * Refuses what is not a finite number within [low, high].
 *
 * @throws NotANumberError, OutOfRangeError
 */
export function requireWithin(
  what: string,
  value: number,
  low: number,
  high: number,
  unit: '°C' | 'mV',
): void {
  if (!Number.isFinite(value)) throw new NotANumberError(what)
  if (value < low || value > high) throw new OutOfRangeError(what, value, low, high, unit)
}
