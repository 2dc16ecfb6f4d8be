import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { emfMillivolts } from '#shared/thermometry'
import { solveRun } from '#shared/thermometry/run'
import { baseType, celsius, conductor, randomRun } from './arbitraries'
import { joint, run, section, twoSections } from './build'

/** The laws of thermoelectric circuits as stated in ASTM MNL 12, chapter 2, on random runs. */
const CASES = { numRuns: 1000 }

describe('law of homogeneous conductors', () => {
  it('a run of one pair throughout delivers E(tip) − E(terminals), whatever lies between', () => {
    fc.assert(
      fc.property(
        baseType,
        celsius,
        celsius,
        fc.array(celsius, { maxLength: 6 }),
        (type, tip, terminals, between) => {
          const sections = Array.from({ length: between.length + 1 }, (_, i) => section(`s${i}`, type))
          const joints = between.map((_, i) => joint(`j${i}`, `z${i}`))
          const zoneCelsius = Object.fromEntries([
            ['tip', tip],
            ['terminals', terminals],
            ...between.map((value, i) => [`z${i}`, value]),
          ])
          const solution = solveRun(run(type, sections, joints), { zoneCelsius })
          const expected = emfMillivolts(type, tip) - emfMillivolts(type, terminals)
          expect(solution.terminalMillivolts).toBeCloseTo(expected, 8)
          expect(solution.findings).toEqual([])
        },
      ),
      CASES,
    )
  })

  it('unequal contacts in a run of one pair change nothing', () => {
    fc.assert(
      fc.property(
        baseType,
        celsius,
        celsius,
        celsius,
        fc.double({ min: 0, max: 30, noNaN: true }),
        (type, tip, plug, terminals, offset) => {
          const zoneCelsius = { tip, plug, terminals }
          const even = solveRun(twoSections(type, type), { zoneCelsius })
          const uneven = solveRun(
            run(
              type,
              [section('a', type), section('b', type)],
              [joint('plug', 'plug', { positiveOffsetKelvin: offset })],
            ),
            { zoneCelsius },
          )
          // Single legs and the letter function of one pair are different published data: 3e-7 mV apart at most.
          expect(uneven.terminalMillivolts).toBeCloseTo(even.terminalMillivolts ?? Number.NaN, 5)
        },
      ),
      CASES,
    )
  })
})

describe('law of intermediate metals', () => {
  it('any conductors between two joints of one temperature add nothing', () => {
    fc.assert(
      fc.property(
        baseType,
        conductor,
        conductor,
        celsius,
        celsius,
        celsius,
        (type, a, b, tip, middle, terminals) => {
          const zoneCelsius = { tip, middle, terminals }
          const plain = solveRun(run(type, [section('s', type)], []), { zoneCelsius })
          const inserted = solveRun(
            run(
              type,
              [section('s0', type), section('pigtail', [a, b]), section('s1', type)],
              [joint('j0', 'middle'), joint('j1', 'middle')],
            ),
            { zoneCelsius },
          )
          expect(inserted.terminalMillivolts).toBeCloseTo(plain.terminalMillivolts ?? Number.NaN, 8)
          expect(inserted.findings.filter(({ code }) => code === 'stray-junction')).toEqual([])
        },
      ),
      CASES,
    )
  })

  it('contact metal of any kind in a joint of one temperature adds nothing', () => {
    fc.assert(
      fc.property(
        baseType,
        conductor,
        conductor,
        celsius,
        celsius,
        celsius,
        (type, a, b, tip, plug, terminals) => {
          const zoneCelsius = { tip, plug, terminals }
          const metals = { positiveMetal: a, negativeMetal: b }
          const plain = solveRun(twoSections(type, type), { zoneCelsius })
          const pinned = solveRun(
            run(type, [section('a', type), section('b', type)], [joint('plug', 'plug', metals)]),
            { zoneCelsius },
          )
          expect(pinned.terminalMillivolts).toBeCloseTo(plain.terminalMillivolts ?? Number.NaN, 8)
          expect(pinned.emfErrorMicrovolts).toBeCloseTo(0, 4)
        },
      ),
      CASES,
    )
  })
})

describe('law of intermediate temperatures', () => {
  it('emf between T1 and T3 is the emf between T1 and T2 plus that between T2 and T3, for any pair', () => {
    fc.assert(
      fc.property(conductor, conductor, celsius, celsius, celsius, (a, b, t1, t2, t3) => {
        const emf = (tip: number, terminals: number) =>
          solveRun(run('K', [section('s', [a, b])], []), { zoneCelsius: { tip, terminals } })
            .terminalMillivolts ?? Number.NaN
        expect(emf(t1, t3)).toBeCloseTo(emf(t1, t2) + emf(t2, t3), 8)
      }),
      CASES,
    )
  })
})

describe('any run at all', () => {
  it('contact shares add up to the emf error', () => {
    fc.assert(
      fc.property(randomRun, ({ run: built, zoneCelsius }) => {
        const solution = solveRun(built, { zoneCelsius })
        const sum = solution.contactShares.reduce((total, share) => total + share.microvolts, 0)
        // 1e-3 µV: legs and letter functions of J and N come from different published data.
        expect(Math.abs(sum - (solution.emfErrorMicrovolts ?? Number.NaN))).toBeLessThan(2e-3)
      }),
      CASES,
    )
  })

  it('emf shares of the causes add up to the emf error, degrees to the whole error', () => {
    fc.assert(
      fc.property(randomRun, ({ run: built, zoneCelsius }) => {
        const { causes, emfErrorMicrovolts, errorKelvin } = solveRun(built, { zoneCelsius })
        const microvolts = causes.reduce((total, cause) => total + (cause.microvolts ?? 0), 0)
        expect(Math.abs(microvolts - (emfErrorMicrovolts ?? Number.NaN))).toBeLessThan(2e-3)
        if (errorKelvin === null || causes.some((cause) => cause.kelvin === null)) return
        const kelvins = causes.reduce((total, cause) => total + (cause.kelvin ?? 0), 0)
        expect(Math.abs(kelvins - errorKelvin)).toBeLessThan(1e-4)
      }),
      CASES,
    )
  })

  it('exchanging every pair and crossing the terminals is the same circuit', () => {
    fc.assert(
      fc.property(randomRun, ({ run: built, zoneCelsius }) => {
        const level = { ...built.terminals, positiveOffsetKelvin: 0, negativeOffsetKelvin: 0 }
        const joints = built.joints.map((j) => ({ ...j, positiveOffsetKelvin: 0, negativeOffsetKelvin: 0 }))
        const a = { ...built, joints, terminals: level }
        const b = {
          ...a,
          sections: a.sections.map((s) => ({ ...s, positive: s.negative, negative: s.positive })),
          joints: a.joints.map((j) => ({
            ...j,
            positiveMetal: j.negativeMetal,
            negativeMetal: j.positiveMetal,
          })),
          terminals: { ...level, crossed: !level.crossed },
        }
        const first = solveRun(a, { zoneCelsius }).terminalMillivolts ?? Number.NaN
        const second = solveRun(b, { zoneCelsius }).terminalMillivolts ?? Number.NaN
        expect(second).toBeCloseTo(first, 9)
      }),
      CASES,
    )
  })

  it('cooling every zone to one temperature leaves no emf: agreement when cold proves nothing', () => {
    fc.assert(
      fc.property(randomRun, celsius, ({ run: built, zoneCelsius }, level) => {
        const joints = built.joints.map((j) => ({ ...j, positiveOffsetKelvin: 0, negativeOffsetKelvin: 0 }))
        const terminals = { ...built.terminals, positiveOffsetKelvin: 0, negativeOffsetKelvin: 0 }
        const same = Object.fromEntries(Object.keys(zoneCelsius).map((zone) => [zone, level]))
        const solution = solveRun({ ...built, joints, terminals }, { zoneCelsius: same })
        expect(solution.terminalMillivolts).toBe(0)
      }),
      CASES,
    )
  })
})
