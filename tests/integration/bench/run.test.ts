import { describe, expect, it } from 'vitest'
import type { RunSolution, RunStatesSolution } from '#shared/thermometry'
import type { Problem } from '#shared/types/problem'
import { send } from '../support/http'

const joint = {
  id: 'plug',
  label: 'Plug pair',
  kind: 'plug-pair',
  tipSideZone: 'bay',
  displaySideZone: 'bay',
  crossed: false,
  positiveMetal: null,
  negativeMetal: null,
  positiveOffsetKelvin: 0,
  negativeOffsetKelvin: 0,
}

const section = (id: string, positive: string, negative: string) => ({ id, label: id, positive, negative })

/** A type K probe, extended in copper from the engine bay to the display. */
const copperExtension = {
  type: 'K',
  tipZone: 'exhaust',
  sections: [section('probe', 'KP', 'KN'), section('extension', 'Cu', 'Cu')],
  joints: [joint],
  terminals: { zone: 'panel', crossed: false, positiveOffsetKelvin: 0, negativeOffsetKelvin: 0 },
  display: { typeSetting: 'K', compensation: { kind: 'internal', sensorOffsetKelvin: 0 } },
}
const conditions = { zoneCelsius: { exhaust: 700, bay: 70, panel: 25 } }

const solve = <Body>(json: unknown) => send<Body>('POST', '/api/bench/run', { json })

describe('one set of conditions', () => {
  it('explains a copper extension: low by the rise from terminals to plug', async () => {
    const { status, body } = await solve<RunSolution>({ run: copperExtension, conditions })
    expect(status).toBe(200)
    // Published table, type K: 700 °C 29.129 mV, 70 °C 2.851 mV; copper adds nothing.
    expect(body.terminalMillivolts).toBeCloseTo(29.129 - 2.851, 2)
    expect(body.errorKelvin).toBeLessThan(-40)
    expect(body.errorKelvin).toBeGreaterThan(-50)
    expect(body.findings.map(({ code }) => code)).toContain('stray-junction')
  })

  it('finds nothing wrong where the cable is of the right alloys', async () => {
    const sections = [section('probe', 'KP', 'KN'), section('extension', 'KP', 'KN')]
    const { body } = await solve<RunSolution>({ run: { ...copperExtension, sections }, conditions })
    expect(body.errorKelvin).toBeCloseTo(0, 6)
    expect(body.findings).toEqual([])
  })
})

describe('operating states', () => {
  it('are solved together, with the worst of them', async () => {
    const states = [
      { id: 'cold', name: 'Cold', zoneCelsius: { exhaust: 20, bay: 20, panel: 20 } },
      { id: 'climb', name: 'Climb', ...conditions },
    ]
    const { status, body } = await solve<RunStatesSolution>({ run: copperExtension, states })
    expect(status).toBe(200)
    expect(body.states.map(({ id }) => id)).toEqual(['cold', 'climb'])
    expect(body.worst).toMatchObject({ id: 'climb', name: 'Climb' })
  })
})

describe('bad input names field and reason', () => {
  const refusal = async (json: unknown) => {
    const { status, headers, body } = await solve<Problem>(json)
    expect(status).toBe(422)
    expect(headers.get('content-type')).toBe('application/problem+json')
    return body.errors
  }

  it('an unknown conductor', async () => {
    const sections = [section('probe', 'KP', 'XX'), section('extension', 'Cu', 'Cu')]
    expect(await refusal({ run: { ...copperExtension, sections }, conditions })).toContainEqual({
      field: 'run.sections.0.negative',
      reason: 'Choose a conductor from the list.',
    })
  })

  it('a zone without a temperature', async () => {
    const missing = { zoneCelsius: { exhaust: 700, panel: 25 } }
    expect(await refusal({ run: copperExtension, conditions: missing })).toContainEqual({
      field: 'conditions.zoneCelsius.bay',
      reason: 'The run passes the zone "bay", but no temperature is given for it.',
    })
  })

  it('joints that do not fit the sections', async () => {
    expect(await refusal({ run: { ...copperExtension, joints: [] }, conditions })).toContainEqual({
      field: 'run.joints',
      reason: 'A run of 2 sections has 1 joints.',
    })
  })

  it('neither conditions nor states', async () => {
    expect(await refusal({ run: copperExtension })).toContainEqual({
      field: 'conditions',
      reason: 'Give either conditions or states.',
    })
  })
})
