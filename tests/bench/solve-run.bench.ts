import { bench, describe } from 'vitest'
import { emfPath, solveRunOverStates } from '#shared/thermometry/run'
import { joint, run, section } from '../unit/thermometry/run/build'

const states = Array.from({ length: 8 }, (_, s) => ({
  id: `s${s}`,
  name: `State ${s}`,
  zoneCelsius: Object.fromEntries([
    ['tip', 400 + 40 * s],
    ['terminals', 20 + s],
    ...Array.from({ length: 15 }, (_, i) => [`z${i}`, 120 - 5 * i + s]),
  ]),
}))

/** The largest run the product takes, with a copper stretch in the middle. */
const longest = run(
  'K',
  Array.from({ length: 16 }, (_, i) => section(`s${i}`, i === 8 ? ['Cu', 'Cu'] : 'K')),
  Array.from({ length: 15 }, (_, i) => joint(`j${i}`, `z${i}`)),
)

describe('a run of 16 sections', () => {
  bench('solved over eight operating states', () => {
    solveRunOverStates(longest, states)
  })

  bench('drawn on the emf-against-temperature plane', () => {
    emfPath(longest, states[0] ?? { zoneCelsius: {} })
  })
})
