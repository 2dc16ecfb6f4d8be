import type { SingleLegFunction } from './types'

/**
 * Conductors of type B.
 * Source: NIST Monograph 175 (1993), single thermoelements against platinum Pt-67.
 */
export const B_LEGS = {
  BP: {
    verified: true,
    pieces: [
      {
        lowCelsius: 0,
        highCelsius: 630.615,
        coefficients: [
          0, 0.0048227875687, 0.000015651165709, -2.2233797882e-8, 2.8333244074e-11, -2.0258940447e-14,
          6.1488705096e-18,
        ],
      },
      {
        lowCelsius: 630.615,
        highCelsius: 1768.1,
        coefficients: [
          -7.9680432282, 0.063941110213, -0.0001710242141, 3.0555782527e-7, -3.2105744492e-10,
          2.0909102794e-13, -8.2335825426e-17, 1.7822841515e-20, -1.6187074187e-24,
        ],
      },
    ],
  },
  BN: {
    verified: true,
    pieces: [
      {
        lowCelsius: 0,
        highCelsius: 630.615,
        coefficients: [
          0, 0.00506929575216, 0.0000097471235919, -2.09080047184e-8, 2.67664148839e-11, -1.8564487523e-14,
          5.51896703866e-18,
        ],
      },
      {
        lowCelsius: 630.615,
        highCelsius: 1768.1,
        coefficients: [
          -4.0742263661, 0.035369362743, -0.000086139109315, 1.4770502363e-7, -1.5270399628e-10,
          9.799308781e-14, -3.7820394393e-17, 7.9252774329e-21, -6.8079411581e-25,
        ],
      },
    ],
  },
} satisfies Record<string, SingleLegFunction>
