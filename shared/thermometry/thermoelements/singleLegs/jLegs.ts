import type { SingleLegFunction } from './types'

/**
 * Conductors of type J. They close with the letter type; no second source was found for the split between them.
 * Source: NIST Monograph 175 (1993), single thermoelements against platinum Pt-67.
 */
export const J_LEGS = {
  JP: {
    verified: false,
    pieces: [
      {
        lowCelsius: -210,
        highCelsius: 760,
        coefficients: [
          0, 0.017913548559, 0.0000046774663358, -7.1225992991e-8, 1.3352125016e-10, -1.5008962639e-13,
          1.5514319625e-16, -7.9503572125e-20, 2.429790391e-24,
        ],
      },
    ],
  },
  JN: {
    verified: false,
    pieces: [
      {
        lowCelsius: -210,
        highCelsius: 760,
        coefficients: [
          0, -0.032467639256, -0.0000257983705942, 1.4455072729e-8, 1.23929721e-12, 2.043995698e-14,
          -5.433771072e-17, 4.5880381235e-20, -1.3201935306e-23,
        ],
      },
    ],
  },
} satisfies Record<string, SingleLegFunction>
