import { mountSuspended } from '@nuxt/test-utils/runtime'
import { describe, expect, it } from 'vitest'
import ReadingSum from '~/components/channel/ReadingSum.vue'
import type { RunFixture } from '../../fixtures/runs'
import { copperExtension, rightRun, swappedAtTerminals } from '../../fixtures/runs'
import { plain, solved } from './support'

async function rows(fixture: RunFixture) {
  const { solution } = solved(fixture)
  const sum = await mountSuspended(ReadingSum, { props: { run: fixture.run, solution } })
  return { sum, lines: sum.findAll('tr').map((row) => plain(row.text())), solution }
}

describe('ReadingSum', () => {
  it('writes the sum from the tip to the reading', async () => {
    const { lines } = await rows(rightRun())
    expect(lines).toEqual([
      'Tip at200.0°C',
      '1 Probe lead+5.204mV',
      '2 Extension cable+1.772mV',
      'At the terminals6.976mV',
      'Cold-junction compensation for 29.0 °C, type K+1.163mV',
      'Makes8.138mV',
      'Shown by a type K display as200.0°C',
      'Error against the tip0.0°C',
    ])
  })

  it('says what the tip is not', async () => {
    const { sum } = await rows(rightRun())
    expect(sum.text()).toContain('which is not the gas’s or the metal’s')
  })

  it('shows the error of a copper extension', async () => {
    const { lines, solution } = await rows(copperExtension())
    expect(solution.errorKelvin).toBeCloseTo(-44.3, 1)
    expect(lines.at(-1)).toBe('Error against the tip−44.3°C')
  })

  it('off scale: no degrees, the emf all the same', async () => {
    const { sum, lines } = await rows(swappedAtTerminals())
    expect(lines.at(-1)).toContain('off scale, low')
    expect(lines).toContain('At the terminals−6.976mV')
    expect(plain(sum.text())).toContain('The display stops at −20.0 °C')
  })

  it('withheld: no figure, and where to look', async () => {
    const fixture = copperExtension()
    const [climb] = fixture.states
    fixture.states = [{ ...climb, zoneCelsius: { ...climb.zoneCelsius, bay: 500 } }]
    const { sum, lines } = await rows(fixture)
    expect(lines.at(-1)).toContain('no figure')
    expect(sum.text()).toContain('the findings say where')
  })

  it('a display that adds degrees: after the conversion', async () => {
    const fixture = rightRun()
    const display = {
      ...fixture.run.display,
      compensation: { kind: 'adds-degrees', sensorOffsetKelvin: 0 },
    } as const
    const { lines } = await rows({ ...fixture, run: { ...fixture.run, display } })
    expect(lines).toContain('Converted, then the terminals’ degrees added+29.0°C')
    expect(lines.some((line) => line.startsWith('Makes'))).toBe(false)
  })

  it('lights its line with the drawing, and the drawing with its line', async () => {
    const { solution } = solved(rightRun())
    const sum = await mountSuspended(ReadingSum, {
      props: { run: rightRun().run, solution, selected: 'section:probe' },
    })
    expect(sum.findAll('tr')[1]?.classes()).toContain('bg-paper')
    await sum.findAll('tr')[2]?.trigger('pointerenter')
    expect(sum.emitted('update:hovered')).toEqual([['section:extension']])
  })
})
