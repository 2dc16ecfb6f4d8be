import { describe, expect, it } from 'vitest'
import { solveRun } from '#shared/thermometry/run'
import { joint, run, section, twoSections } from './build'

const conditions = { zoneCelsius: { tip: 200, bay: 70, plug: 70, firewall: 50, terminals: 25 } }

const placesOf = (built: Parameters<typeof solveRun>[0]) =>
  solveRun(built, conditions)
    .contactShares.filter(({ place }) => place.kind === 'joint')
    .map(({ place, side, leg }) => [place.kind === 'joint' ? place.jointId : '', side, leg])

describe('a stray junction stands at the contact where the metal changes', () => {
  it('behind pins of the probe’s own alloy', () => {
    const pins = joint('plug', 'plug', { positiveMetal: 'KP', negativeMetal: 'KN' })
    expect(placesOf({ ...twoSections('K', ['Cu', 'Cu']), joints: [pins] })).toEqual([
      ['plug', 'display-side', 'positive'],
      ['plug', 'display-side', 'negative'],
    ])
  })

  it('before pins of the foreign metal', () => {
    const pins = joint('plug', 'plug', { positiveMetal: 'Cu', negativeMetal: 'Cu' })
    expect(placesOf({ ...twoSections('K', ['Cu', 'Cu']), joints: [pins] })).toEqual([
      ['plug', 'tip-side', 'positive'],
      ['plug', 'tip-side', 'negative'],
    ])
  })

  it('at the splice and not at the plug, where a right length lies between them in one zone', () => {
    const built = run(
      'K',
      [section('probe', 'K'), section('engine', 'K'), section('mend', ['Cu', 'KN']), section('tail', 'K')],
      [joint('plug', 'bay'), joint('hot', 'bay'), joint('cold', 'firewall')],
    )
    expect(placesOf(built)).toEqual([
      ['hot', 'tip-side', 'positive'],
      ['cold', 'tip-side', 'positive'],
    ])
  })
})
