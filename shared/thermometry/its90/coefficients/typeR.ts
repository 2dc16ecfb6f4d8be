import type { ReferenceFunction } from './referenceFunction'

/** Type R, ITS-90. Source: NIST Monograph 175 (1993), coefficients as in NIST Standard Reference Database 60. */
export const TYPE_R: ReferenceFunction = {
  direct: [
    {
      lowCelsius: -50,
      highCelsius: 1064.18,
      coefficients: [
        0, 0.00528961729765, 0.0000139166589782, -2.38855693017e-8, 3.56916001063e-11, -4.62347666298e-14,
        5.00777441034e-17, -3.73105886191e-20, 1.57716482367e-23, -2.81038625251e-27,
      ],
    },
    {
      lowCelsius: 1064.18,
      highCelsius: 1664.5,
      coefficients: [
        2.95157925316, -0.00252061251332, 0.0000159564501865, -7.64085947576e-9, 2.05305291024e-12,
        -2.93359668173e-16,
      ],
    },
    {
      lowCelsius: 1664.5,
      highCelsius: 1768.1,
      coefficients: [
        152.232118209, -0.268819888545, 0.000171280280471, -3.45895706453e-8, -9.34633971046e-15,
      ],
    },
  ],
  inverse: [
    {
      lowMillivolts: -0.226,
      highMillivolts: 1.923,
      coefficients: [
        0, 188.9138, -93.83529, 130.68619, -227.0358, 351.45659, -389.539, 282.39471, -126.07281, 31.353611,
        -3.3187769,
      ],
    },
    {
      lowMillivolts: 1.923,
      highMillivolts: 13.228,
      coefficients: [
        13.34584505, 147.2644573, -18.44024844, 4.031129726, -0.624942836, 0.06468412046, -0.004458750426,
        0.0001994710149, -0.00000531340179, 6.481976217e-8,
      ],
    },
    {
      lowMillivolts: 11.361,
      highMillivolts: 19.739,
      coefficients: [-81.99599416, 155.3962042, -8.342197663, 0.4279433549, -0.0119157791, 0.0001492290091],
    },
    {
      lowMillivolts: 19.739,
      highMillivolts: 21.103,
      coefficients: [34061.77836, -7023.729171, 558.2903813, -19.52394635, 0.2560740231],
    },
  ],
}
