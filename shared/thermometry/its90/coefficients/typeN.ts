import type { ReferenceFunction } from './referenceFunction'

/** Type N, ITS-90. Source: NIST Monograph 175 (1993), coefficients as in NIST Standard Reference Database 60. */
export const TYPE_N: ReferenceFunction = {
  direct: [
    {
      lowCelsius: -270,
      highCelsius: 0,
      coefficients: [
        0, 0.026159105962, 0.000010957484228, -9.3841111554e-8, -4.6412039759e-11, -2.6303357716e-12,
        -2.2653438003e-14, -7.6089300791e-17, -9.3419667835e-20,
      ],
    },
    {
      lowCelsius: 0,
      highCelsius: 1300,
      coefficients: [
        0, 0.025929394601, 0.00001571014188, 4.3825627237e-8, -2.5261169794e-10, 6.4311819339e-13,
        -1.0063471519e-15, 9.9745338992e-19, -6.0863245607e-22, 2.0849229339e-25, -3.0682196151e-29,
      ],
    },
  ],
  inverse: [
    {
      lowMillivolts: -3.99,
      highMillivolts: 0,
      coefficients: [
        0, 38.436847, 1.1010485, 5.2229312, 7.2060525, 5.8488586, 2.7754916, 0.77075166, 0.11582665,
        0.0073138868,
      ],
    },
    {
      lowMillivolts: 0,
      highMillivolts: 20.613,
      coefficients: [
        0, 38.6896, -1.08267, 0.0470205, -0.00000212169, -0.000117272, 0.0000053928, -7.98156e-8,
      ],
    },
    {
      lowMillivolts: 20.613,
      highMillivolts: 47.513,
      coefficients: [19.72485, 33.00943, -0.3915159, 0.009855391, -0.0001274371, 7.767022e-7],
    },
  ],
}
