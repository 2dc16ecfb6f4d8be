import { describe, expect, it } from 'vitest'
import type { RunSolution } from '#shared/thermometry/run'
import { solveRun } from '#shared/thermometry/run'
import { display, joint, run, section, twoSections } from '../unit/thermometry/run/build'

/**
 * Runs worked by hand from the printed 1 °C tables (NIST Monograph 175, table of type K, reference junction at
 * 0 °C). Hand results carry the rounding of the printed table: half a digit in each of at most four entries,
 * 0.002 mV in the sum, 0.05 °C in the reading.
 */
const EMF_TOLERANCE = 0.002
const READING_TOLERANCE = 0.05

function shown(solution: RunSolution): number {
  if (solution.indication.kind !== 'value') throw new Error(solution.indication.kind)
  return solution.indication.celsius
}

function expectNear(actual: number | null, expected: number, tolerance: number): void {
  expect(Math.abs((actual ?? Number.NaN) - expected)).toBeLessThanOrEqual(tolerance)
}

describe('worked by hand from the printed table of type K', () => {
  /*
   * Tip 400 °C, plug pair 60 °C, terminals 30 °C. From the table: E(400) = 16.397, E(60) = 2.436,
   * E(30) = 1.203 mV.
   *
   * Copper from plug to terminals adds nothing between its equal conductors:
   *   at the terminals  16.397 − 2.436         = 13.961 mV
   *   compensation      + E(30)                =  1.203 mV
   *   converted                                  15.164 mV
   *   table: E(370) = 15.133, E(371) = 15.175, so 370 + (15.164 − 15.133) / 0.042 = 370.74 °C
   * Low by 29.3 K, about the 30 K between plug and terminals.
   */
  it('copper extension: 13.961 mV at the terminals, 370.7 °C shown', () => {
    const solution = solveRun(twoSections('K', ['Cu', 'Cu']), {
      zoneCelsius: { tip: 400, plug: 60, terminals: 30 },
    })
    expectNear(solution.terminalMillivolts, 13.961, EMF_TOLERANCE)
    expectNear(shown(solution), 370.74, READING_TOLERANCE)
    expectNear(solution.errorKelvin, -29.26, READING_TOLERANCE)
  })

  /*
   * The same, with a type K extension whose pair is swapped at the plug and at the terminals: the extension now
   * opposes the probe.
   *   at the terminals  (16.397 − 2.436) − (2.436 − 1.203) = 12.728 mV
   *   compensation      + 1.203                            = 13.931 mV
   *   table: E(341) = 13.916, E(342) = 13.958, so 341 + 0.015 / 0.042 = 341.36 °C
   * Low by 58.6 K: twice the copper error.
   */
  it('extension swapped at both ends: 12.728 mV at the terminals, 341.4 °C shown', () => {
    const terminals = { zone: 'terminals', crossed: true, positiveOffsetKelvin: 0, negativeOffsetKelvin: 0 }
    const swapped = run(
      'K',
      [section('probe', 'K'), section('ext', 'K')],
      [joint('plug', 'plug', { crossed: true })],
      { terminals },
    )
    const solution = solveRun(swapped, { zoneCelsius: { tip: 400, plug: 60, terminals: 30 } })
    expectNear(solution.terminalMillivolts, 12.728, EMF_TOLERANCE)
    expectNear(shown(solution), 341.36, READING_TOLERANCE)
    expectNear(solution.errorKelvin, -58.64, READING_TOLERANCE)
  })

  /*
   * The copper extension with the plug colder than the terminals: E(20) = 0.798.
   * Tip 400, plug 20, terminals 30: 16.397 − 0.798 + 1.203 = 16.802 mV, 0.405 mV more than E(400): reads high.
   */
  it('copper extension with a colder plug reads high', () => {
    const solution = solveRun(twoSections('K', ['Cu', 'Cu']), {
      zoneCelsius: { tip: 400, plug: 20, terminals: 30 },
    })
    expectNear(solution.terminalMillivolts, 15.599, EMF_TOLERANCE)
    expect(solution.errorKelvin).toBeGreaterThan(9)
    expect(solution.errorKelvin).toBeLessThan(10)
  })

  /*
   * A type J circuit read by an input set to K, tip 250 °C, terminals 30 °C. Tables: J E(250) = 13.555,
   * E(30) = 1.537; K E(30) = 1.203 mV. 13.555 − 1.537 + 1.203 = 13.221 mV; type K: E(324) = 13.206,
   * E(325) = 13.248, so 324 + 0.015 / 0.042 = 324.36 °C: 74 K too much.
   */
  it('type J probe on an input set to K, 250 °C: 324.4 °C shown', () => {
    const solution = solveRun(twoSections('J', 'J', { display: display('K') }), {
      zoneCelsius: { tip: 250, plug: 60, terminals: 30 },
    })
    expectNear(solution.terminalMillivolts, 13.555 - 1.537, EMF_TOLERANCE)
    expectNear(shown(solution), 324.36, READING_TOLERANCE)
  })

  /* Ice-water check, common practice: tip in ice, terminals at 20 °C, −E(20) = −0.798 mV, and 0 °C shown. */
  it('tip in ice, terminals at 20 °C: −0.798 mV and 0 °C shown', () => {
    const solution = solveRun(twoSections('K', 'K'), { zoneCelsius: { tip: 0, plug: 15, terminals: 20 } })
    expectNear(solution.terminalMillivolts, -0.798, 0.0005)
    expectNear(shown(solution), 0, 1e-6)
  })
})
