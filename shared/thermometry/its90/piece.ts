import type { DirectPiece } from './coefficients'
import { polynomial, polynomialDerivative } from './polynomial'

/** The piece that holds at a temperature within the function's range; at a join the upper one. */
export function pieceAt(pieces: readonly [DirectPiece, ...DirectPiece[]], celsius: number): DirectPiece {
  let found = pieces[0]
  for (const piece of pieces) if (celsius >= piece.lowCelsius) found = piece
  return found
}

/** Value of a piece, mV. */
export function pieceMillivolts({ coefficients, gaussian }: DirectPiece, celsius: number): number {
  const value = polynomial(coefficients, celsius)
  return gaussian ? value + gaussian.a0 * Math.exp(gaussian.a1 * (celsius - gaussian.a2) ** 2) : value
}

/** Derivative of a piece, mV/K. */
export function pieceMillivoltsPerKelvin({ coefficients, gaussian }: DirectPiece, celsius: number): number {
  const slope = polynomialDerivative(coefficients, celsius)
  if (!gaussian) return slope
  const { a0, a1, a2 } = gaussian
  return slope + 2 * a0 * a1 * (celsius - a2) * Math.exp(a1 * (celsius - a2) ** 2)
}
