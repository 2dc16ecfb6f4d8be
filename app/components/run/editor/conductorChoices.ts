import type { Thermoelement } from '#shared/thermometry'
import { THERMOELEMENTS, thermoelementInfo } from '#shared/thermometry'

/** Every conductor by symbol and alloy. */
export const conductorChoices = THERMOELEMENTS.map((id) => {
  const { symbol, name } = thermoelementInfo(id)
  return { value: id, text: symbol.toLowerCase() === name ? name : `${symbol}, ${name}` }
})

/** The same for the metal of a contact, which may have no length of its own. */
export const contactChoices: { value: Thermoelement | null; text: string }[] = [
  { value: null, text: 'none: the conductors meet directly' },
  ...conductorChoices,
]
