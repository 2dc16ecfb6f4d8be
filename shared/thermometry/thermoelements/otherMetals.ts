/**
 * Other metals against platinum, mV at 0, 100, 200, 300 and 400 °C, reference junction at 0 °C.
 * Source: values as recalled from the NBS table of Roeser and Wensel that the physics handbooks reproduce; no copy
 * was at hand, so every one of them is unverified. Good enough to name a stray junction, not to correct for it.
 */
export const OTHER_METALS_AGAINST_PLATINUM = {
  aluminium: [0, 0.42, 1.06, 1.88, 2.84],
  'beryllium-copper': [0, 0.67, 1.62, 2.81, 4.19],
  brass: [0, 0.6, 1.49, 2.58, 3.85],
  gold: [0, 0.78, 1.84, 3.14, 4.63],
  iron: [0, 1.89, 3.54, 4.85, 5.88],
  lead: [0, 0.44, 1.09, 1.91],
  manganin: [0, 0.61, 1.55, 2.77, 4.25],
  nickel: [0, -1.48, -3.1, -4.59, -5.45],
  'nickel-chromium-80-20': [0, 1.14, 2.62, 4.34, 6.25],
  'nickel-chromium-iron-60-16-24': [0, 0.85, 2.01, 3.41, 5],
  'phosphor-bronze': [0, 0.55, 1.34, 2.34, 3.5],
  silver: [0, 0.74, 1.77, 3.05, 4.57],
  'spring-steel': [0, 1.32, 2.63, 3.81, 4.84],
  'stainless-steel-18-8': [0, 0.44, 1.04, 1.76, 2.6],
  tin: [0, 0.42, 1.07],
  'tin-lead-solder': [0, 0.46],
  'tin-silver-solder': [0, 0.45],
  tungsten: [0, 1.12, 2.62, 4.48, 6.7],
  zinc: [0, 0.76, 1.89, 3.42, 5.29],
} as const satisfies Record<string, readonly [number, number, ...number[]]>

export type OtherMetal = keyof typeof OTHER_METALS_AGAINST_PLATINUM

/** Distance of the table's entries, K. */
export const OTHER_METALS_STEP_KELVIN = 100
