import { mountSuspended } from '@nuxt/test-utils/runtime'
import { afterEach, describe, expect, it } from 'vitest'
import { nextTick } from 'vue'
import DecimalInput from '~/components/form/DecimalInput.vue'
import SelectInput from '~/components/form/SelectInput.vue'
import TemperatureInput from '~/components/form/TemperatureInput.vue'
import TextInput from '~/components/form/TextInput.vue'
import { DEFAULT_PREFERENCES, useUnitsStore } from '~/stores/units'

afterEach(() => useUnitsStore().use(DEFAULT_PREFERENCES))

describe('TextInput', () => {
  it('has its label above, and names hint and error to a screen reader', async () => {
    const input = await mountSuspended(TextInput, {
      props: { modelValue: '', name: 'tag', label: 'Tag', hint: 'Such as EGT 3.', error: 'Enter a tag.' },
    })
    const field = input.get('input')
    expect(input.get('label').attributes('for')).toBe(field.attributes('id'))
    expect(field.attributes('aria-invalid')).toBe('true')
    const described = (field.attributes('aria-describedby') ?? '').split(' ')
    expect(described.map((id) => input.get(`#${id}`).text())).toEqual(['Such as EGT 3.', '▲ Enter a tag.'])
  })
})

describe('DecimalInput', () => {
  async function typed(text: string) {
    const input = await mountSuspended(DecimalInput, {
      props: { modelValue: 1, name: 'n', label: 'N', unit: 'm' },
    })
    await input.get('input').setValue(text)
    return input.emitted('update:modelValue')?.at(-1)?.[0]
  }

  it('takes a decimal comma and stray spaces', async () => {
    expect(await typed(' 2,5 ')).toBe(2.5)
  })

  it('makes nothing of an empty field, and no number of text', async () => {
    expect(await typed('')).toBeNull()
    expect(await typed('twelve')).toBeNaN()
  })

  it('keeps what was typed where it is no number', async () => {
    const input = await mountSuspended(DecimalInput, { props: { modelValue: 1, name: 'n', label: 'N' } })
    await input.get('input').setValue('1o')
    await input.get('input').trigger('blur')
    expect(input.get('input').element.value).toBe('1o')
  })
})

describe('TemperatureInput', () => {
  it('shows °F where chosen, over a model in °C', async () => {
    useUnitsStore().use({ ...DEFAULT_PREFERENCES, temperatureUnit: 'fahrenheit' })
    const input = await mountSuspended(TemperatureInput, {
      props: { modelValue: 100, name: 't', label: 'T' },
    })
    expect(input.get('input').element.value).toBe('212')
    await input.get('input').setValue('32')
    expect(input.emitted('update:modelValue')?.at(-1)).toEqual([0])
  })

  it('converts a difference without the 32°', async () => {
    useUnitsStore().use({ ...DEFAULT_PREFERENCES, temperatureUnit: 'fahrenheit' })
    const input = await mountSuspended(TemperatureInput, {
      props: { modelValue: 10, name: 't', label: 'T', difference: true },
    })
    expect(input.get('input').element.value).toBe('18')
  })

  it('follows a change of unit', async () => {
    const input = await mountSuspended(TemperatureInput, { props: { modelValue: 20, name: 't', label: 'T' } })
    useUnitsStore().use({ ...DEFAULT_PREFERENCES, temperatureUnit: 'fahrenheit' })
    await nextTick()
    expect(input.get('input').element.value).toBe('68')
    expect(input.text()).toContain('°F')
  })

  it('carries its label for the screen reader where a grid shows none', async () => {
    const input = await mountSuspended(TemperatureInput, {
      props: { modelValue: 20, name: 't', label: 'Cabin, Climb', bare: true },
    })
    expect(input.get('input').attributes('aria-label')).toBe('Cabin, Climb, °C')
  })
})

describe('SelectInput', () => {
  it('hands over the value, not its text', async () => {
    const choices = [
      { value: null, text: 'None' },
      { value: 7, text: 'Seven' },
    ]
    const select = await mountSuspended(SelectInput, {
      props: { modelValue: null, name: 's', label: 'S', choices },
    })
    await select.get('select').setValue(select.findAll('option')[1]?.element.value)
    expect(select.emitted('update:modelValue')?.at(-1)).toEqual([7])
  })
})
