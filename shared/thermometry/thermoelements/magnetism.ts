import type { Thermoelement } from './ids'

const ATTRACTED: readonly Thermoelement[] = ['JP', 'KN', 'iron', 'nickel', 'spring-steel']

/** Left open: cold work makes 18/8 steel magnetic, and no figures were at hand for the others. */
const UNKNOWN: readonly Thermoelement[] = ['NN', 'nickel-chromium-iron-60-16-24', 'stainless-steel-18-8']

/**
 * Whether a magnet attracts a conductor at room temperature; undefined where that is not known.
 *
 * Source: workshop practice of telling the legs of J and K by a magnet, and the ferromagnetism of iron and nickel;
 * not from a table.
 */
export function isMagnetic(element: Thermoelement): boolean | undefined {
  return UNKNOWN.includes(element) ? undefined : ATTRACTED.includes(element)
}
