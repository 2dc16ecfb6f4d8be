import type { SingleLegFunction } from './types'

/**
 * Conductors of type N. They close with the letter type; no second source was found for the split between them
 * (below 400 °C in doubt by less than 0.001 mV, at 1000 °C by 0.1 mV).
 * Source: NIST Monograph 175 (1993), single thermoelements against platinum Pt-67.
 */
export const N_LEGS = {
  NP: {
    verified: false,
    pieces: [
      {
        lowCelsius: -270,
        highCelsius: 0,
        coefficients: [
          0, 0.01541798843, 0.000025707382457, -9.0187825771e-8, -5.3654793005e-10, -3.3526215976e-12,
          -7.272344767e-15,
        ],
      },
      {
        lowCelsius: 0,
        highCelsius: 1300,
        coefficients: [
          0, 0.015445385947, 0.000026722341289, -2.5595313052e-8, -3.3028097414e-11, 2.0075322971e-13,
          -4.270815423e-16, 5.1813473522e-19, -3.6887124931e-22, 1.4268734708e-25, -2.3121302154e-29,
        ],
      },
    ],
  },
  NN: {
    verified: false,
    pieces: [
      {
        lowCelsius: -270,
        highCelsius: 0,
        coefficients: [
          0, -0.010741117532, 0.000014749898229, 3.653285783e-9, -4.90135890291e-10, -7.22285826e-13,
          1.5381093236e-14, 7.6089300791e-17, 9.3419667835e-20,
        ],
      },
      {
        lowCelsius: 0,
        highCelsius: 1300,
        coefficients: [
          0, -0.010484008654, 0.000011012199409, -6.9420940289e-8, 2.19583600526e-10, -4.4236496368e-13,
          5.792656096e-16, -4.793186547e-19, 2.3976120676e-22, -6.580494631e-26, 7.560893997e-30,
        ],
      },
    ],
  },
} satisfies Record<string, SingleLegFunction>
