/** Σ cᵢ xⁱ by Horner's rule. */
export function polynomial(coefficients: readonly number[], x: number): number {
  let sum = 0
  for (let i = coefficients.length - 1; i >= 0; i--) sum = sum * x + (coefficients[i] ?? 0)
  return sum
}

/** d/dx Σ cᵢ xⁱ by Horner's rule. */
export function polynomialDerivative(coefficients: readonly number[], x: number): number {
  let sum = 0
  for (let i = coefficients.length - 1; i >= 1; i--) sum = sum * x + i * (coefficients[i] ?? 0)
  return sum
}
