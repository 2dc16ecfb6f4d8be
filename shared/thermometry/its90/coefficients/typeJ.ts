import type { ReferenceFunction } from './referenceFunction'

/** Type J, ITS-90. Source: NIST Monograph 175 (1993), coefficients as in NIST Standard Reference Database 60. */
export const TYPE_J: ReferenceFunction = {
  direct: [
    {
      lowCelsius: -210,
      highCelsius: 760,
      coefficients: [
        0, 0.050381187815, 0.00003047583693, -8.568106572e-8, 1.3228195295e-10, -1.7052958337e-13,
        2.0948090697e-16, -1.2538395336e-19, 1.5631725697e-23,
      ],
    },
    {
      lowCelsius: 760,
      highCelsius: 1200,
      coefficients: [
        296.45625681, -1.4976127786, 0.0031787103924, -0.0000031847686701, 1.5720819004e-9, -3.0691369056e-13,
      ],
    },
  ],
  inverse: [
    {
      lowMillivolts: -8.095,
      highMillivolts: 0,
      coefficients: [
        0, 19.528268, -1.2286185, -1.0752178, -0.59086933, -0.17256713, -0.028131513, -0.002396337,
        -0.000083823321,
      ],
    },
    {
      lowMillivolts: 0,
      highMillivolts: 42.919,
      coefficients: [
        0, 19.78425, -0.2001204, 0.01036969, -0.0002549687, 0.000003585153, -5.344285e-8, 5.09989e-10,
      ],
    },
    {
      lowMillivolts: 42.919,
      highMillivolts: 69.553,
      coefficients: [-3113.58187, 300.543684, -9.9477323, 0.17027663, -0.00143033468, 0.00000473886084],
    },
  ],
}
