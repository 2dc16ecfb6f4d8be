/** E = Σ cᵢ tⁱ (+ a0·exp(a1·(t − a2)²)), mV, t in °C. */
export interface DirectPiece {
  lowCelsius: number
  highCelsius: number
  coefficients: readonly number[]
  gaussian?: { a0: number; a1: number; a2: number }
}

/** t ≈ Σ dᵢ Eⁱ, °C, E in mV: a first guess only. */
export interface InversePiece {
  lowMillivolts: number
  highMillivolts: number
  coefficients: readonly number[]
}

export interface ReferenceFunction {
  direct: readonly [DirectPiece, ...DirectPiece[]]
  inverse: readonly [InversePiece, ...InversePiece[]]
}
