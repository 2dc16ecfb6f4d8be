import type { ReferenceFunction } from './referenceFunction'

/** Type K, ITS-90. Source: NIST Monograph 175 (1993), coefficients as in NIST Standard Reference Database 60. */
export const TYPE_K: ReferenceFunction = {
  direct: [
    {
      lowCelsius: -270,
      highCelsius: 0,
      coefficients: [
        0, 0.039450128025, 0.000023622373598, -3.2858906784e-7, -4.9904828777e-9, -6.7509059173e-11,
        -5.7410327428e-13, -3.1088872894e-15, -1.0451609365e-17, -1.9889266878e-20, -1.6322697486e-23,
      ],
    },
    {
      lowCelsius: 0,
      highCelsius: 1372,
      coefficients: [
        -0.017600413686, 0.038921204975, 0.000018558770032, -9.9457592874e-8, 3.1840945719e-10,
        -5.6072844889e-13, 5.6075059059e-16, -3.2020720003e-19, 9.7151147152e-23, -1.2104721275e-26,
      ],
      gaussian: { a0: 0.1185976, a1: -0.0001183432, a2: 126.9686 },
    },
  ],
  inverse: [
    {
      lowMillivolts: -5.891,
      highMillivolts: 0,
      coefficients: [
        0, 25.173462, -1.1662878, -1.0833638, -0.8977354, -0.37342377, -0.086632643, -0.010450598,
        -0.00051920577,
      ],
    },
    {
      lowMillivolts: 0,
      highMillivolts: 20.644,
      coefficients: [
        0, 25.08355, 0.07860106, -0.2503131, 0.0831527, -0.01228034, 0.0009804036, -0.0000441303,
        0.000001057734, -1.052755e-8,
      ],
    },
    {
      lowMillivolts: 20.644,
      highMillivolts: 54.886,
      coefficients: [-131.8058, 48.30222, -1.646031, 0.05464731, -0.0009650715, 0.000008802193, -3.11081e-8],
    },
  ],
}
