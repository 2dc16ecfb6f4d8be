import type { ReferenceFunction } from './referenceFunction'

/** Type S, ITS-90. Source: NIST Monograph 175 (1993), coefficients as in NIST Standard Reference Database 60. */
export const TYPE_S: ReferenceFunction = {
  direct: [
    {
      lowCelsius: -50,
      highCelsius: 1064.18,
      coefficients: [
        0, 0.00540313308631, 0.000012593428974, -2.32477968689e-8, 3.22028823036e-11, -3.31465196389e-14,
        2.55744251786e-17, -1.25068871393e-20, 2.71443176145e-24,
      ],
    },
    {
      lowCelsius: 1064.18,
      highCelsius: 1664.5,
      coefficients: [
        1.32900444085, 0.00334509311344, 0.00000654805192818, -1.64856259209e-9, 1.29989605174e-14,
      ],
    },
    {
      lowCelsius: 1664.5,
      highCelsius: 1768.1,
      coefficients: [
        146.628232636, -0.258430516752, 0.000163693574641, -3.30439046987e-8, -9.43223690612e-15,
      ],
    },
  ],
  inverse: [
    {
      lowMillivolts: -0.235,
      highMillivolts: 1.874,
      coefficients: [
        0, 184.94946, -80.0504062, 102.23743, -152.248592, 188.821343, -159.085941, 82.302788, -23.4181944,
        2.7978626,
      ],
    },
    {
      lowMillivolts: 1.874,
      highMillivolts: 11.95,
      coefficients: [
        12.91507177, 146.6298863, -15.34713402, 3.145945973, -0.4163257839, 0.03187963771, -0.0012916375,
        0.00002183475087, -1.447379511e-7, 8.211272125e-9,
      ],
    },
    {
      lowMillivolts: 10.332,
      highMillivolts: 17.536,
      coefficients: [-80.87801117, 162.1573104, -8.536869453, 0.4719686976, -0.01441693666, 0.000208161889],
    },
    {
      lowMillivolts: 17.536,
      highMillivolts: 18.693,
      coefficients: [53338.75126, -12358.92298, 1092.657613, -42.65693686, 0.624720542],
    },
  ],
}
