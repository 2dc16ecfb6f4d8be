import type { ReferenceFunction } from './referenceFunction'

/** Type B, ITS-90. Source: NIST Monograph 175 (1993), coefficients as in NIST Standard Reference Database 60. */
export const TYPE_B: ReferenceFunction = {
  direct: [
    {
      lowCelsius: 0,
      highCelsius: 630.615,
      coefficients: [
        0, -0.00024650818346, 0.0000059040421171, -1.3257931636e-9, 1.5668291901e-12, -1.694452924e-15,
        6.2990347094e-19,
      ],
    },
    {
      lowCelsius: 630.615,
      highCelsius: 1820,
      coefficients: [
        -3.8938168621, 0.02857174747, -0.000084885104785, 1.5785280164e-7, -1.6835344864e-10,
        1.1109794013e-13, -4.4515431033e-17, 9.8975640821e-21, -9.3791330289e-25,
      ],
    },
  ],
  inverse: [
    {
      lowMillivolts: 0.291,
      highMillivolts: 2.431,
      coefficients: [
        98.423321, 699.715, -847.65304, 1005.2644, -833.45952, 455.08542, -155.23037, 29.88675, -2.474286,
      ],
    },
    {
      lowMillivolts: 2.431,
      highMillivolts: 13.82,
      coefficients: [
        213.15071, 285.10504, -52.742887, 9.9160804, -1.2965303, 0.1119587, -0.0060625199, 0.00018661696,
        -0.0000024878585,
      ],
    },
  ],
}
