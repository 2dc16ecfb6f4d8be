import { mountSuspended } from '@nuxt/test-utils/runtime'
import { describe, expect, it } from 'vitest'
import StateStrip from '~/components/channel/StateStrip.vue'
import type { RunFixture } from '../../fixtures/runs'
import { copperExtension, rightRun, swappedAtTerminals } from '../../fixtures/runs'
import { plain, solved } from './support'

const mount = (fixture: RunFixture, modelValue = '1') =>
  mountSuspended(StateStrip, { props: { ...solved(fixture).states, modelValue } })

describe('StateStrip', () => {
  it('offers one radio for each state, in one group with a name', async () => {
    const strip = await mount(copperExtension())
    const radios = strip.findAll('input[type="radio"]')
    expect(radios).toHaveLength(4)
    expect(new Set(radios.map((radio) => radio.attributes('name'))).size).toBe(1)
    expect(strip.find('legend').text()).toBe('Operating state')
  })

  it('shows name, reading and error of each state', async () => {
    const first = (await mount(copperExtension())).find('label').text()
    expect(plain(first)).toBe('Climb155.7°Cerror −44.3°C')
  })

  it('points at the worst state, where there is one', async () => {
    const worst = (await mount(copperExtension()))
      .findAll('label')
      .filter((label) => label.text().includes('worst'))
    expect(worst.map((label) => plain(label.text()).slice(0, 9))).toEqual(['Heat soak'])
    expect((await mount(rightRun())).text()).not.toContain('worst')
  })

  it('shows off scale in words', async () => {
    const strip = await mount(swappedAtTerminals())
    expect(strip.find('label').text()).toContain('off scale, low')
    expect(strip.find('label').text()).not.toContain('error')
  })

  it('switches the state', async () => {
    const strip = await mount(copperExtension())
    await strip.findAll('input')[2]?.setValue(true)
    expect(strip.emitted('update:modelValue')).toEqual([['3']])
  })

  it('names the chosen state on paper', async () => {
    expect((await mount(copperExtension(), '4')).find('p').text()).toBe('Operating state: Heat soak')
  })
})
