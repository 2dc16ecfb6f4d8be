import { describe, expect, it } from 'vitest'
import { describeFinding, figureWords, runNames } from '#shared/domain/findings'
import type { Finding, FindingCode } from '#shared/thermometry/run'
import { copperExtension } from '../../../fixtures/runs'

const names = runNames(copperExtension().run)
const figures = figureWords({ temperatureUnit: 'celsius', lengthUnit: 'metre' })
const plug = { kind: 'joint', jointId: 'plug' } as const
const extension = { kind: 'section', sectionId: 'extension' } as const
const range = { celsius: 1100, lowCelsius: -270, highCelsius: 1000 }

/** One of each; the type makes sure that none is forgotten. */
const SAMPLES: { [Code in FindingCode]: Extract<Finding, { code: Code }> } = {
  'stray-junction': {
    code: 'stray-junction',
    place: plug,
    leg: 'positive',
    metals: ['KP', 'Cu'],
    celsius: 72,
    microvolts: -878.2,
    kelvin: -21.94,
  },
  'legs-swapped': {
    code: 'legs-swapped',
    sectionIds: ['extension'],
    places: [plug, { kind: 'terminals' }],
    microvolts: -3543,
  },
  'wrong-conductor': {
    code: 'wrong-conductor',
    place: extension,
    leg: 'negative',
    actual: 'Cu',
    intended: 'KN',
  },
  'harmless-metal': { code: 'harmless-metal', place: plug, leg: 'positive', metal: 'brass' },
  'unequal-contacts': { code: 'unequal-contacts', place: { kind: 'terminals' }, differenceKelvin: -3 },
  'display-type-mismatch': { code: 'display-type-mismatch', setting: 'J', type: 'K' },
  'compensation-missing': { code: 'compensation-missing', referenceCelsius: 29 },
  'compensation-error': { code: 'compensation-error', compensationCelsius: 33, referenceCelsius: 29 },
  'compensation-adds-degrees': { code: 'compensation-adds-degrees', referenceCelsius: 29 },
  'display-error': { code: 'display-error', gainErrorFraction: 0.01, offsetKelvin: -2 },
  'reference-block-missing': { code: 'reference-block-missing' },
  'outside-conductor-range': {
    code: 'outside-conductor-range',
    place: extension,
    leg: 'negative',
    conductor: 'KN',
    ...range,
  },
  'tip-outside-type-range': { code: 'tip-outside-type-range', type: 'K', ...range },
  'off-scale': { code: 'off-scale', direction: 'low', millivolts: -5.813, limitCelsius: -20 },
}

const tell = (finding: Finding) => describeFinding(finding, names, figures)

describe.each(Object.values(SAMPLES))('$code', (finding) => {
  const words = tell(finding)

  it('has a title, a reason and something to do, in whole sentences', () => {
    expect(words.title).toMatch(/^[A-Z]/)
    expect(words.title).not.toMatch(/\.$/)
    for (const text of [words.explanation, words.whatToDo, ...words.cautions])
      expect(text).toMatch(/^[A-Z].*\.$/s)
  })

  it('lets no raw value through', () => {
    const all = [words.title, words.explanation, words.whatToDo].join(' ')
    expect(all).not.toMatch(/NaN|undefined|null|\[object|Infinity| {2}/)
    expect(all).not.toMatch(/\d\.\d{4,}/)
  })
})

describe('what is named', () => {
  it('a stray junction: place, leg, alloys, temperature, µV and degrees', () => {
    const { title, explanation } = tell(SAMPLES['stray-junction'])
    expect(title).toBe('Stray junction at the plug pair, positive leg')
    expect(explanation).toContain('At 72.0\u00a0°C, KP (nickel-chromium) meets copper.')
    expect(explanation).toContain('−878\u00a0µV')
    expect(explanation).toContain('21.9\u00a0°C too low')
  })

  it('degrees in the unit of the person, without the 32° offset', () => {
    const fahrenheit = figureWords({ temperatureUnit: 'fahrenheit', lengthUnit: 'foot' })
    expect(describeFinding(SAMPLES['stray-junction'], names, fahrenheit).explanation).toContain(
      '39.5\u00a0°F too low',
    )
  })

  it('no degrees where the display shows none', () => {
    const { explanation } = tell({ ...SAMPLES['stray-junction'], kelvin: null })
    expect(explanation).toContain('cannot be said')
  })

  it('both joints of a pair that is swapped at both ends', () => {
    const { title, explanation } = tell(SAMPLES['legs-swapped'])
    expect(title).toBe('Legs swapped at the plug pair and the display terminals')
    expect(explanation).toContain('twice')
  })

  it('a pair swapped once: no word of a second place', () => {
    const once = tell({ ...SAMPLES['legs-swapped'], places: [{ kind: 'terminals' }], microvolts: null })
    expect(once.title).toBe('Legs swapped at the display terminals')
    expect(once.explanation).not.toContain('twice')
  })

  it('the magnet test only where it tells', () => {
    expect(tell(SAMPLES['legs-swapped']).whatToDo).toContain('magnet draws KN')
    const typeT = runNames({ ...copperExtension().run, type: 'T' })
    expect(describeFinding(SAMPLES['legs-swapped'], typeT, figures).whatToDo).not.toContain('magnet')
  })

  it('which way compensation errs', () => {
    expect(tell(SAMPLES['compensation-error']).title).toBe('Cold-junction compensation 4.0\u00a0°C too high')
    const low = tell({ code: 'compensation-error', compensationCelsius: 25, referenceCelsius: 29 })
    expect(low.explanation).toContain('too low by about as much')
  })

  it('contacts that are off by the same amount are not called unequal', () => {
    expect(tell({ ...SAMPLES['unequal-contacts'], differenceKelvin: 0 }).title).toMatch(/^Contacts off/)
    expect(tell(SAMPLES['unequal-contacts']).explanation).toContain('3.0\u00a0°C colder')
  })

  it('a letter type that is out of its range, for the whole pair', () => {
    const pair = tell({ ...SAMPLES['outside-conductor-range'], leg: null, conductor: 'K' })
    expect(pair.title).toBe('No figures for type K at 1100.0\u00a0°C')
    expect(pair.explanation).not.toContain('leg')
  })

  it('where to look first when the display is off scale', () => {
    expect(tell(SAMPLES['off-scale']).whatToDo).toContain('swapped at the terminals')
    expect(tell({ ...SAMPLES['off-scale'], direction: 'high' }).whatToDo).toContain('type setting')
  })

  it('a part that is no longer in the run, without failing', () => {
    const gone = { kind: 'joint', jointId: 'gone' } as const
    expect(tell({ ...SAMPLES['harmless-metal'], place: gone }).title).toContain('a joint')
  })
})

describe('severity', () => {
  it('a foreign metal between equal temperatures is a note', () => {
    expect(tell(SAMPLES['harmless-metal']).severity).toBe('note')
  })

  it.each([
    [0.4, 'caution'],
    [-0.99, 'caution'],
    [1, 'fault'],
    [null, 'fault'],
  ])('a stray junction of %s K is a %s', (kelvin, severity) => {
    expect(tell({ ...SAMPLES['stray-junction'], kelvin }).severity).toBe(severity)
  })

  it('compensation within a kelvin is a caution', () => {
    const small = { code: 'compensation-error', compensationCelsius: 29.5, referenceCelsius: 29 } as const
    expect(tell(small).severity).toBe('caution')
  })
})

describe('cautions', () => {
  it('stand where resistance is measured', () => {
    expect(tell(SAMPLES['wrong-conductor']).cautions).toContain(
      'Disconnect battery and display before resistance checks.',
    )
  })

  it('stand where a joint is warmed', () => {
    expect(tell(SAMPLES['stray-junction']).cautions.join(' ')).toMatch(/heat gun near fuel vapour/)
  })

  it('say what agreement when cold is worth wherever alloy, polarity or type is in doubt', () => {
    for (const code of [
      'stray-junction',
      'legs-swapped',
      'wrong-conductor',
      'display-type-mismatch',
    ] as const)
      expect(tell(SAMPLES[code]).cautions.join(' ')).toContain('when cold proves nothing')
  })
})
