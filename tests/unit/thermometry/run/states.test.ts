import { describe, expect, it } from 'vitest'
import { emfPath, solveRun, solveRunOverStates } from '#shared/thermometry/run'
import { twoSections } from './build'

const states = [
  { id: 'cold', name: 'Cold', zoneCelsius: { tip: 20, plug: 20, terminals: 20 } },
  { id: 'climb', name: 'Climb', zoneCelsius: { tip: 800, plug: 90, terminals: 30 } },
  { id: 'idle', name: 'Idle', zoneCelsius: { tip: 500, plug: 60, terminals: 25 } },
]

describe('solveRunOverStates', () => {
  it('names the state with the largest error', () => {
    const solved = solveRunOverStates(twoSections('K', ['Cu', 'Cu']), states)
    expect(solved.states.map(({ id }) => id)).toEqual(['cold', 'climb', 'idle'])
    expect(solved.worst?.id).toBe('climb')
    expect(solved.worst?.errorKelvin).toBe(solved.states[1]?.solution.errorKelvin)
  })

  it('takes off scale for worse than any number, and a withheld answer for worst', () => {
    const terminals = { zone: 'terminals', crossed: true, positiveOffsetKelvin: 0, negativeOffsetKelvin: 0 }
    expect(solveRunOverStates(twoSections('K', 'K', { terminals }), states).worst?.indication.kind).toBe(
      'off-scale-low',
    )
    const hot = { id: 'hot', name: 'Hot', zoneCelsius: { tip: 800, plug: 450, terminals: 30 } }
    expect(solveRunOverStates(twoSections('K', ['Cu', 'Cu']), [...states, hot]).worst?.id).toBe('hot')
  })

  it('has no worst without states', () => {
    expect(solveRunOverStates(twoSections('K', 'K'), [])).toEqual({ states: [], worst: null })
  })
})

describe('emfPath', () => {
  const conditions = { zoneCelsius: { tip: 400, plug: 60, terminals: 30 } }

  it('ends at the emf of the run', () => {
    const built = twoSections('K', ['Cu', 'Cu'])
    const end = emfPath(built, conditions)?.negative.at(-1)?.points.at(-1)
    expect(end?.millivolts).toBeCloseTo(solveRun(built, conditions).terminalMillivolts ?? Number.NaN, 6)
    expect(end?.celsius).toBe(30)
  })

  it('is continuous and falls on the intended line for a right run', () => {
    const path = emfPath(twoSections('K', 'K'), conditions)
    const stretches = [...(path?.positive ?? []), ...(path?.negative ?? [])]
    stretches.slice(1).forEach((stretch, i) => {
      expect(stretch.points[0]).toEqual(stretches[i]?.points.at(-1))
    })
    expect(path?.intended).toEqual(stretches.flatMap(({ points }) => points))
  })

  it('is not drawn where single-leg data do not reach', () => {
    expect(emfPath(twoSections('K', 'K'), { zoneCelsius: { tip: 1200, plug: 60, terminals: 30 } })).toBeNull()
  })
})
