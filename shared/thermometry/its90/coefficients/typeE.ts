import type { ReferenceFunction } from './referenceFunction'

/** Type E, ITS-90. Source: NIST Monograph 175 (1993), coefficients as in NIST Standard Reference Database 60. */
export const TYPE_E: ReferenceFunction = {
  direct: [
    {
      lowCelsius: -270,
      highCelsius: 0,
      coefficients: [
        0, 0.058665508708, 0.000045410977124, -7.7998048686e-7, -2.5800160843e-8, -5.9452583057e-10,
        -9.3214058667e-12, -1.0287605534e-13, -8.0370123621e-16, -4.3979497391e-18, -1.6414776355e-20,
        -3.9673619516e-23, -5.5827328721e-26, -3.4657842013e-29,
      ],
    },
    {
      lowCelsius: 0,
      highCelsius: 1000,
      coefficients: [
        0, 0.05866550871, 0.000045032275582, 2.8908407212e-8, -3.3056896652e-10, 6.502440327e-13,
        -1.9197495504e-16, -1.2536600497e-18, 2.1489217569e-21, -1.4388041782e-24, 3.5960899481e-28,
      ],
    },
  ],
  inverse: [
    {
      lowMillivolts: -8.825,
      highMillivolts: 0,
      coefficients: [
        0, 16.977288, -0.4351497, -0.15859697, -0.092502871, -0.026084314, -0.0041360199, -0.0003403403,
        -0.00001156489,
      ],
    },
    {
      lowMillivolts: 0,
      highMillivolts: 76.373,
      coefficients: [
        0, 17.057035, -0.23301759, 0.0065435585, -0.000073562749, -0.0000017896001, 8.4036165e-8,
        -1.3735879e-9, 1.0629823e-11, -3.2447087e-14,
      ],
    },
  ],
}
