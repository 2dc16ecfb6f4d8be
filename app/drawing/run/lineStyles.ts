import type { Thermoelement } from '#shared/thermometry'

/** How a conductor of an alloy is drawn: alloys differ by pattern and weight, so that colour need not tell them. */
export interface LineStyle {
  /** Stroke width, drawing units. */
  weight: number
  /** Value of `stroke-dasharray`; null for an unbroken line. */
  dashes: string | null
}

const OTHER: LineStyle = { weight: 2.5, dashes: '4 4' }

const STYLES: Partial<Record<Thermoelement, LineStyle>> = {
  KP: { weight: 3, dashes: null },
  EP: { weight: 3, dashes: null },
  KN: { weight: 3, dashes: '14 4' },
  TN: { weight: 3, dashes: '14 4 3 4' },
  EN: { weight: 3, dashes: '14 4 3 4' },
  JP: { weight: 4.5, dashes: null },
  JN: { weight: 3, dashes: '14 4 3 4 3 4' },
  NP: { weight: 3.5, dashes: '20 3' },
  NN: { weight: 3, dashes: '9 4' },
  RP: { weight: 2, dashes: null },
  SP: { weight: 2, dashes: null },
  BP: { weight: 2, dashes: null },
  RN: { weight: 2, dashes: '9 4' },
  SN: { weight: 2, dashes: '9 4' },
  BN: { weight: 2, dashes: '9 4' },
  Cu: { weight: 3.5, dashes: '2.5 2.5' },
  TP: { weight: 3.5, dashes: '2.5 2.5' },
}

/** The line style of a conductor's alloy. */
export function lineStyle(element: Thermoelement): LineStyle {
  return STYLES[element] ?? OTHER
}
