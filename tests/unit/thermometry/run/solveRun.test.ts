import { describe, expect, it } from 'vitest'
import { emfMillivolts } from '#shared/thermometry'
import type { Finding, FindingCode, RunSolution } from '#shared/thermometry/run'
import { RunInputError, solveRun } from '#shared/thermometry/run'
import { display, joint, run, section, twoSections } from './build'

const warm = { zoneCelsius: { tip: 400, plug: 60, terminals: 30 } }

function indicated(solution: RunSolution): number {
  if (solution.indication.kind !== 'value') throw new Error(`shows ${solution.indication.kind}`)
  return solution.indication.celsius
}

function codes(solution: RunSolution): FindingCode[] {
  return solution.findings.map(({ code }) => code)
}

function finding<Code extends FindingCode>(
  solution: RunSolution,
  code: Code,
): Extract<Finding, { code: Code }> {
  const found = solution.findings.find((f): f is Extract<Finding, { code: Code }> => f.code === code)
  if (!found) throw new Error(`no finding ${code} among ${codes(solution).join(', ')}`)
  return found
}

describe('a run as intended', () => {
  it('shows the tip temperature, without findings or causes', () => {
    const solution = solveRun(twoSections('K', 'K'), warm)
    expect(indicated(solution)).toBeCloseTo(400, 6)
    expect(solution.findings).toEqual([])
    expect(solution.causes).toEqual([])
    expect(solution.contactShares).toEqual([])
  })

  it('takes E and K positive conductors for one another, as the standards do', () => {
    expect(codes(solveRun(twoSections('K', ['EP', 'KN']), warm))).toEqual([])
  })

  it('uses the letter function of a matched pair beyond the single-leg data', () => {
    const hot = { zoneCelsius: { tip: 1300, plug: 1100, terminals: 30 } }
    expect(indicated(solveRun(twoSections('K', 'K'), hot))).toBeCloseTo(1300, 5)
  })
})

describe('a copper extension', () => {
  const solution = solveRun(twoSections('K', ['Cu', 'Cu']), warm)

  it('loses the emf between plug and terminals', () => {
    const expected = emfMillivolts('K', 400) - emfMillivolts('K', 60)
    expect(solution.terminalMillivolts).toBeCloseTo(expected, 9)
    expect(solution.errorKelvin).toBeCloseTo(-29.26, 1)
  })

  it('reads high when the plug is colder than the terminals', () => {
    const cold = { zoneCelsius: { tip: 400, plug: 0, terminals: 30 } }
    expect(solveRun(twoSections('K', ['Cu', 'Cu']), cold).errorKelvin).toBeGreaterThan(25)
  })

  it('names both stray junctions at the plug with metals and shares that add up', () => {
    const strays = solution.findings.filter((f) => f.code === 'stray-junction')
    expect(strays.map(({ place, leg, metals }) => [place, leg, metals])).toEqual([
      [{ kind: 'joint', jointId: 'plug' }, 'positive', ['KP', 'Cu']],
      [{ kind: 'joint', jointId: 'plug' }, 'negative', ['KN', 'Cu']],
    ])
    const sum = strays.reduce((total, stray) => total + stray.microvolts, 0)
    expect(sum).toBeCloseTo((emfMillivolts('K', 30) - emfMillivolts('K', 60)) * 1000, 4)
    expect(strays.every(({ kelvin }) => kelvin !== null && kelvin < 0)).toBe(true)
  })

  it('is one cause, the conductors of the extension', () => {
    expect(solution.causes.map(({ kind, place }) => [kind, place])).toEqual([
      ['conductors', { kind: 'section', sectionId: 'ext' }],
    ])
    expect(solution.causes[0]?.kelvin).toBeCloseTo(solution.errorKelvin ?? Number.NaN, 6)
  })

  it('is still named where nothing shows, with all zones at one temperature', () => {
    const even = solveRun(twoSections('K', ['Cu', 'Cu']), {
      zoneCelsius: { tip: 20, plug: 20, terminals: 20 },
    })
    expect(codes(even)).toEqual(['wrong-conductor', 'wrong-conductor'])
    expect(even.errorKelvin).toBeCloseTo(0, 6)
  })
})

describe('swapped legs', () => {
  it('at both ends of an extension: about twice the copper error, named at both joints', () => {
    const crossed = twoSections('K', 'K', {
      joints: [joint('plug', 'plug', { crossed: true })],
      terminals: { zone: 'terminals', crossed: true, positiveOffsetKelvin: 0, negativeOffsetKelvin: 0 },
    })
    const solution = solveRun(crossed, warm)
    expect(solution.errorKelvin).toBeCloseTo(-58.65, 1)
    const swap = finding(solution, 'legs-swapped')
    expect(swap.sectionIds).toEqual(['ext'])
    expect(swap.places).toEqual([{ kind: 'joint', jointId: 'plug' }, { kind: 'terminals' }])
    expect(codes(solution)).not.toContain('wrong-conductor')
    expect(solution.causes.map(({ kind }) => kind)).toEqual(['legs-swapped'])
  })

  it('is the same whether recorded as crossings or as exchanged conductors', () => {
    const crossed = twoSections('K', 'K', {
      joints: [joint('plug', 'plug', { crossed: true })],
      terminals: { zone: 'terminals', crossed: true, positiveOffsetKelvin: 0, negativeOffsetKelvin: 0 },
    })
    const exchanged = twoSections('K', '-K')
    expect(solveRun(exchanged, warm).terminalMillivolts).toBe(solveRun(crossed, warm).terminalMillivolts)
    expect(codes(solveRun(exchanged, warm))).toEqual(codes(solveRun(crossed, warm)))
  })

  it('at the plug only is named there', () => {
    const solution = solveRun(
      run('K', [section('probe', 'K'), section('ext', 'K')], [joint('plug', 'plug', { crossed: true })]),
      warm,
    )
    expect(finding(solution, 'legs-swapped').places).toEqual([{ kind: 'joint', jointId: 'plug' }])
    expect(finding(solution, 'legs-swapped').sectionIds).toEqual(['probe'])
  })

  it('at the terminals only is named there, and drives the display off scale: an answer, with its emf', () => {
    const terminals = { zone: 'terminals', crossed: true, positiveOffsetKelvin: 0, negativeOffsetKelvin: 0 }
    const solution = solveRun(twoSections('K', 'K', { terminals }), warm)
    expect(finding(solution, 'legs-swapped').places).toEqual([{ kind: 'terminals' }])
    expect(solution.indication).toEqual({ kind: 'off-scale-low', limitCelsius: -270 })
    expect(solution.terminalMillivolts).toBeCloseTo(emfMillivolts('K', 30) - emfMillivolts('K', 400), 9)
    expect(solution.errorKelvin).toBeNull()
    expect(solution.causes.every(({ kelvin }) => kelvin === null)).toBe(true)
    expect(finding(solution, 'off-scale').direction).toBe('low')
  })

  it('before a copper extension is placed by the recorded crossing', () => {
    const atPlug = run(
      'K',
      [section('probe', 'K'), section('ext', ['Cu', 'Cu'])],
      [joint('plug', 'plug', { crossed: true })],
    )
    const atTerminals = twoSections('K', ['Cu', 'Cu'], {
      terminals: { zone: 'terminals', crossed: true, positiveOffsetKelvin: 0, negativeOffsetKelvin: 0 },
    })
    expect(finding(solveRun(atPlug, warm), 'legs-swapped').places).toEqual([
      { kind: 'joint', jointId: 'plug' },
    ])
    expect(finding(solveRun(atTerminals, warm), 'legs-swapped').places).toEqual([{ kind: 'terminals' }])
  })

  it('of a marked-reversed cable crossed twice is right', () => {
    const solution = solveRun(
      twoSections('K', '-K', {
        joints: [joint('plug', 'plug', { crossed: true })],
        terminals: { zone: 'terminals', crossed: true, positiveOffsetKelvin: 0, negativeOffsetKelvin: 0 },
      }),
      warm,
    )
    expect(solution.findings).toEqual([])
  })
})

describe('other wiring faults', () => {
  it('one leg spliced in copper: only that leg is named', () => {
    const solution = solveRun(
      run(
        'K',
        [section('probe', 'K'), section('splice', ['Cu', 'KN']), section('ext', 'K')],
        [joint('a', 'plug'), joint('b', 'cool')],
      ),
      { zoneCelsius: { tip: 400, plug: 90, cool: 40, terminals: 30 } },
    )
    const strays = solution.findings.filter((f) => f.code === 'stray-junction')
    expect(strays.map(({ leg, metals }) => [leg, metals])).toEqual([
      ['positive', ['KP', 'Cu']],
      ['positive', ['Cu', 'KP']],
    ])
    expect(finding(solution, 'wrong-conductor')).toMatchObject({
      leg: 'positive',
      actual: 'Cu',
      intended: 'KP',
    })
  })

  it('a copper pin in a plug of one temperature is harmless and said to be', () => {
    const pins = { positiveMetal: 'Cu', negativeMetal: 'Cu' } as const
    const built = run('K', [section('probe', 'K'), section('ext', 'K')], [joint('plug', 'plug', pins)])
    expect(codes(solveRun(built, warm))).toEqual(['harmless-metal', 'harmless-metal'])
  })

  it('a copper feed-through between a hot and a cold side is a stray junction', () => {
    const pins = { positiveMetal: 'Cu', negativeMetal: 'Cu', displaySideZone: 'cabin' } as const
    const built = run('K', [section('probe', 'K'), section('ext', 'K')], [joint('wall', 'plug', pins)])
    const solution = solveRun(built, { zoneCelsius: { ...warm.zoneCelsius, cabin: 25 } })
    expect(solution.causes.map(({ kind }) => kind)).toEqual(['contact-metal'])
    expect(codes(solution)).toEqual(Array.from({ length: 4 }, () => 'stray-junction'))
    expect(solution.emfErrorMicrovolts).toBeCloseTo(
      (emfMillivolts('K', 25) - emfMillivolts('K', 60)) * 1000,
      4,
    )
  })

  it('terminals warmer than the reference point are a cause of their own', () => {
    const terminals = { zone: 'terminals', crossed: false, positiveOffsetKelvin: 5, negativeOffsetKelvin: 5 }
    const solution = solveRun(twoSections('K', 'K', { terminals }), warm)
    expect(solution.causes.map(({ kind }) => kind)).toEqual(['terminal-contacts'])
    expect(solution.emfErrorMicrovolts).toBeCloseTo(
      (emfMillivolts('K', 30) - emfMillivolts('K', 35)) * 1000,
      3,
    )
    expect(codes(solution)).toEqual(['unequal-contacts'])
  })
})

describe('the display', () => {
  it('set to another type converts and compensates by that type', () => {
    const solution = solveRun(twoSections('J', 'J', { display: display('K') }), warm)
    const shown = indicated(solution)
    const emf = emfMillivolts('J', 400) - emfMillivolts('J', 30) + emfMillivolts('K', 30)
    expect(emfMillivolts('K', shown)).toBeCloseTo(emf, 6)
    expect(finding(solution, 'display-type-mismatch')).toMatchObject({ setting: 'K', type: 'J' })
    expect(solution.causes.map(({ kind }) => kind)).toEqual(['display-type'])
  })

  it('without compensation reads low by about the terminal temperature', () => {
    const built = twoSections('K', 'K', { display: display('K', { compensation: { kind: 'none' } }) })
    const solution = solveRun(built, warm)
    expect(codes(solution)).toEqual(['compensation-missing'])
    expect(solution.errorKelvin).toBeGreaterThan(-31)
    expect(solution.errorKelvin).toBeLessThan(-27)
  })

  it('with a warm compensation sensor reads high', () => {
    const compensation = { kind: 'internal', sensorOffsetKelvin: 6 } as const
    const solution = solveRun(twoSections('K', 'K', { display: display('K', { compensation }) }), warm)
    expect(codes(solution)).toEqual(['compensation-error'])
    expect(solution.errorKelvin).toBeGreaterThan(5)
  })

  it.each([
    ['fixed', { kind: 'fixed', celsius: 30 } as const],
    ['zeroed', { kind: 'zeroed', ambientCelsius: 30 } as const],
  ])('%s compensation is right only at its own temperature', (_, compensation) => {
    const built = twoSections('K', 'K', { display: display('K', { compensation }) })
    expect(solveRun(built, warm).findings).toEqual([])
    const cooler = { zoneCelsius: { ...warm.zoneCelsius, terminals: 10 } }
    expect(codes(solveRun(built, cooler))).toEqual(['compensation-error'])
  })

  it('that adds degrees misses what the curve bends', () => {
    const compensation = { kind: 'adds-degrees', sensorOffsetKelvin: 0 } as const
    const solution = solveRun(twoSections('K', 'K', { display: display('K', { compensation }) }), warm)
    expect(codes(solution)).toEqual(['compensation-adds-degrees'])
    expect(Math.abs(solution.errorKelvin ?? 0)).toBeGreaterThan(0.1)
    expect(solution.causes.map(({ kind }) => kind)).toEqual(['compensation'])
  })

  it('with gain and offset errors adds both to the reading', () => {
    const built = twoSections('K', 'K', {
      display: display('K', { gainErrorFraction: 0.01, offsetKelvin: -2 }),
    })
    expect(indicated(solveRun(built, warm))).toBeCloseTo(400 * 1.01 - 2, 6)
  })

  it('of a narrow scale stops at it', () => {
    const built = twoSections('K', 'K', { display: display('K', { highCelsius: 350 }) })
    expect(solveRun(built, warm).indication).toEqual({ kind: 'off-scale-high', limitCelsius: 350 })
  })

  it('behind a reference block takes copper beyond the block as intended', () => {
    const remote = display('K', { compensation: { kind: 'remote-block', sensorOffsetKelvin: 0 } })
    const block = joint('block', 'plug', { kind: 'reference-block' })
    const built = run('K', [section('probe', 'K'), section('copper', ['Cu', 'Cu'])], [block], {
      display: remote,
    })
    const solution = solveRun(built, warm)
    expect(indicated(solution)).toBeCloseTo(400, 6)
    expect(solution.referenceCelsius).toBe(60)
    expect(solution.findings).toEqual([])
    expect(codes(solveRun({ ...built, joints: [joint('plug', 'plug')] }, warm))).toContain(
      'reference-block-missing',
    )
  })
})

describe('beyond the data', () => {
  it('a conductor outside its range withholds the number and names the range', () => {
    const solution = solveRun(twoSections('K', ['Cu', 'Cu']), {
      zoneCelsius: { tip: 800, plug: 500, terminals: 30 },
    })
    expect(solution.indication).toEqual({ kind: 'withheld' })
    expect(solution.terminalMillivolts).toBeNull()
    expect(finding(solution, 'outside-conductor-range')).toMatchObject({
      conductor: 'Cu',
      celsius: 500,
      highCelsius: 400,
    })
  })

  it('a tip hotter than the type reaches is named', () => {
    const solution = solveRun(twoSections('T', 'T'), { zoneCelsius: { tip: 700, plug: 60, terminals: 30 } })
    expect(codes(solution)).toContain('tip-outside-type-range')
    expect(solution.indication.kind).toBe('withheld')
  })

  it('terminals colder than the planned type reaches are named, whatever the conductors', () => {
    const built = twoSections('B', 'K', {
      sections: [section('probe', 'K'), section('ext', 'K')],
      display: display('K'),
    })
    const solution = solveRun(built, { zoneCelsius: { tip: 400, plug: 60, terminals: -10 } })
    expect(solution.indication).toEqual({ kind: 'withheld' })
    expect(finding(solution, 'outside-conductor-range')).toMatchObject({ conductor: 'B', celsius: -10 })
  })

  it('nothing a request can carry throws or makes a figure that is no number', () => {
    for (const [tip, plug, terminals] of [
      [3000, 3000, 3000],
      [-273.15, -273.15, -273.15],
      [400, 3000, -273.15],
    ] as const)
      for (const type of ['B', 'K', 'T'] as const)
        for (const offset of [-500, 0, 500]) {
          const compensation = { kind: 'internal', sensorOffsetKelvin: offset } as const
          const built = twoSections(type, ['Cu', 'KN'], {
            terminals: {
              zone: 'terminals',
              crossed: true,
              positiveOffsetKelvin: offset,
              negativeOffsetKelvin: 0,
            },
            display: display('B', { compensation, gainErrorFraction: -0.5 }),
          })
          const solution = solveRun(built, { zoneCelsius: { tip, plug, terminals } })
          expect(
            JSON.stringify(solution, (_, value: unknown) => (Number.isNaN(value) ? 'NaN' : value)),
          ).not.toMatch(/NaN|Infinity/)
          if (solution.indication.kind === 'withheld') expect(solution.findings).not.toEqual([])
        }
  })

  it('a run that does not hang together is refused by name', () => {
    const broken = { ...twoSections('K', 'K'), joints: [] }
    expect(() => solveRun(broken, warm)).toThrow(RunInputError)
    expect(() => solveRun(twoSections('K', 'K'), { zoneCelsius: { tip: 1, plug: 2 } })).toThrow(/"terminals"/)
    const twoZones = run(
      'K',
      [section('a', 'K'), section('b', 'K')],
      [joint('wall', 'plug', { displaySideZone: 'terminals' })],
    )
    expect(() => solveRun(twoZones, warm)).toThrow(/metal/)
  })
})
