import { mountSuspended } from '@nuxt/test-utils/runtime'
import { afterEach, describe, expect, it, vi } from 'vitest'
import type { CreateDisplayInput } from '#shared/schemas/display'
import type { Zone } from '#shared/types/workbook'
import DisplayFacts from '~/components/display/DisplayFacts.vue'
import DisplayForm from '~/components/display/DisplayForm.vue'
import { DEFAULT_PREFERENCES, useUnitsStore } from '~/stores/units'

const zones: Zone[] = [{ id: 5, version: 1, name: 'Display terminals', kind: 'terminals', position: 0 }]
const display: CreateDisplayInput = {
  name: 'Engine monitor',
  inputs: 12,
  terminalZoneId: 5,
  compensation: { kind: 'internal', sensorOffsetKelvin: 2 },
  gainErrorFraction: 0.01,
  offsetKelvin: 0,
  lowCelsius: null,
  highCelsius: 1000,
  notes: '',
}

afterEach(() => useUnitsStore().use(DEFAULT_PREFERENCES))

function mountForm(save: (input: CreateDisplayInput) => Promise<void>) {
  return mountSuspended(DisplayForm, {
    props: { display, zones, save, submitText: 'Save the display', cancelTo: '/aircraft/7/displays' },
  })
}

describe('DisplayForm', () => {
  it('asks for what the kind of compensation needs, and for nothing where it is none', async () => {
    const save = vi.fn(async () => {})
    const form = await mountForm(save)
    expect(form.text()).toContain('Its sensor reads too much by')
    const kind = form.get('#field-compensation')
    const choose = async (text: string) => {
      const option = kind.findAll('option').find((candidate) => candidate.text() === text)
      await kind.setValue((option?.element as HTMLOptionElement | undefined)?.value)
    }
    await choose('Fixed temperature')
    expect(form.text()).toContain('At this temperature')
    await choose('None')
    expect(form.find('#field-compensation-detail').exists()).toBe(false)
    await form.get('form').trigger('submit')
    await vi.waitFor(() =>
      expect(save).toHaveBeenCalledWith(expect.objectContaining({ compensation: { kind: 'none' } })),
    )
  })

  it('takes a gain error in per cent', async () => {
    const save = vi.fn(async () => {})
    const form = await mountForm(save)
    const gain = form.get('#field-gainErrorFraction')
    expect((gain.element as HTMLInputElement).value).toBe('1')
    await gain.setValue('-0,5')
    await form.get('form').trigger('submit')
    await vi.waitFor(() =>
      expect(save).toHaveBeenCalledWith(expect.objectContaining({ gainErrorFraction: -0.005 })),
    )
  })
})

describe('DisplayFacts', () => {
  it('states a display in words and in the unit chosen, with nothing to press', async () => {
    useUnitsStore().use({ ...DEFAULT_PREFERENCES, temperatureUnit: 'fahrenheit' })
    const facts = await mountSuspended(DisplayFacts, {
      props: { display: { ...display, id: 1, version: 1 }, zones },
    })
    expect(facts.text()).toContain('Display terminals')
    // 2 K more is 3.6 °F more: a difference does not carry the 32.
    expect(facts.text()).toMatch(/sensor error \+3\.6\s°F/)
    expect(facts.text()).toMatch(/1832(\.0)?\s°F/)
    expect(facts.findAll('input, select, button')).toHaveLength(0)
  })
})
