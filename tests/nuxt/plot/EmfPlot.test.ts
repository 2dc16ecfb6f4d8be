import { mountSuspended } from '@nuxt/test-utils/runtime'
import { beforeEach, describe, expect, it } from 'vitest'
import { emfPath } from '#shared/thermometry'
import EmfPlot from '~/components/plot/EmfPlot.vue'
import { DEFAULT_PREFERENCES, useUnitsStore } from '~/stores/units'
import type { RunFixture } from '../../fixtures/runs'
import { copperExtension, rightRun } from '../../fixtures/runs'
import { plain, solved } from '../channel/support'

function mount(fixture: RunFixture, props: { selected?: string } = {}) {
  const { solution } = solved(fixture)
  const { run, states } = fixture
  return mountSuspended(EmfPlot, { props: { run, solution, path: emfPath(run, states[0]), ...props } })
}

describe('EmfPlot', () => {
  beforeEach(() => useUnitsStore().use(DEFAULT_PREFERENCES))

  it('says what it shows', async () => {
    const plot = await mount(rightRun())
    expect(plain(plot.find('svg').attributes('aria-label') ?? '')).toBe(
      'Path of both legs, emf against temperature: from the positive terminal at 29.0 °C to the tip at 200.0 °C and back to the negative terminal, which ends at 6.976 mV.',
    )
  })

  it('writes the axis in the person’s unit', async () => {
    useUnitsStore().use({ ...DEFAULT_PREFERENCES, temperatureUnit: 'fahrenheit' })
    const text = (await mount(rightRun())).find('svg').text()
    expect(text).toContain('Temperature, °F')
    expect(text).toContain('400')
  })

  it('explains stray junctions only where there are any', async () => {
    expect((await mount(copperExtension())).text()).toContain('stray junction')
    expect((await mount(rightRun())).text()).not.toContain('stray junction')
  })

  it('lights both legs of the chosen section', async () => {
    const plot = await mount(rightRun(), { selected: 'section:probe' })
    expect(plot.find('svg').findAll('[data-lit]')).toHaveLength(2)
  })

  it('chooses a stretch by a click on its curve', async () => {
    const plot = await mount(rightRun())
    await plot.find('[role="presentation"]').trigger('click')
    expect(plot.emitted('update:selected')).toEqual([['section:extension']])
  })

  it('says why there is no plot', async () => {
    const { run } = rightRun()
    const { solution } = solved(rightRun())
    const plot = await mountSuspended(EmfPlot, { props: { run, solution, path: null } })
    expect(plot.find('svg').exists()).toBe(false)
    expect(plot.text()).toContain('beyond the temperatures for which its data hold')
  })
})
