import fc from 'fast-check'
import type { LetterType, Thermoelement } from '#shared/thermometry'
import type { RunJoint, RunSection, ThermocoupleRun } from '#shared/thermometry/run'
import { display, joint, run, section } from './build'

/** Base-metal types: the ones an engine carries, with single-leg data between −50 and 350 °C. */
export const baseType = fc.constantFrom<LetterType>('E', 'J', 'K', 'N', 'T')

/** Conductors whose single-leg data all hold between 0 and 350 °C. */
export const conductor = fc.constantFrom<Thermoelement>('KP', 'KN', 'JP', 'JN', 'TN', 'NP', 'NN', 'Cu')

/** A temperature at which every conductor above has data, °C. */
export const celsius = fc.double({ min: 1, max: 350, noNaN: true })

export interface RandomRun {
  run: ThermocoupleRun
  zoneCelsius: Record<string, number>
}

/** A run of any conductors, crossings, contact metals and contact offsets, with a temperature for every zone. */
export const randomRun: fc.Arbitrary<RandomRun> = fc
  .record({
    type: baseType,
    pairs: fc.array(fc.tuple(conductor, conductor), { minLength: 1, maxLength: 6 }),
    crossed: fc.array(fc.boolean(), { minLength: 6, maxLength: 6 }),
    metals: fc.array(fc.tuple(conductor, conductor), { minLength: 5, maxLength: 5 }),
    offsets: fc.array(fc.double({ min: -0.9, max: 20, noNaN: true }), { minLength: 12, maxLength: 12 }),
    zones: fc.array(celsius, { minLength: 12, maxLength: 12 }),
    setting: baseType,
    sensorOffsetKelvin: fc.double({ min: -10, max: 10, noNaN: true }),
  })
  .map(({ type, pairs, crossed, metals, offsets, zones, setting, sensorOffsetKelvin }) => {
    const sections: RunSection[] = pairs.map((pair, i) => section(`s${i}`, pair))
    const joints: RunJoint[] = pairs.slice(1).map((_, i) =>
      joint(`j${i}`, `hot${i}`, {
        displaySideZone: `cold${i}`,
        crossed: crossed[i] ?? false,
        positiveMetal: metals[i]?.[0] ?? 'Cu',
        negativeMetal: metals[i]?.[1] ?? 'Cu',
        positiveOffsetKelvin: offsets[2 * i] ?? 0,
        negativeOffsetKelvin: offsets[2 * i + 1] ?? 0,
      }),
    )
    const zoneCelsius: Record<string, number> = { tip: zones[0] ?? 1, terminals: zones[1] ?? 1 }
    joints.forEach((_, i) => {
      zoneCelsius[`hot${i}`] = zones[2 + 2 * i] ?? 1
      zoneCelsius[`cold${i}`] = zones[3 + 2 * i] ?? 1
    })
    const terminals = {
      zone: 'terminals',
      crossed: crossed[5] ?? false,
      positiveOffsetKelvin: offsets[10] ?? 0,
      negativeOffsetKelvin: offsets[11] ?? 0,
    }
    const compensation = { kind: 'internal', sensorOffsetKelvin } as const
    return {
      run: run(type, sections, joints, { terminals, display: display(setting, { compensation }) }),
      zoneCelsius,
    }
  })
