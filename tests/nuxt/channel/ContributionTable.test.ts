import { mountSuspended } from '@nuxt/test-utils/runtime'
import { describe, expect, it } from 'vitest'
import ContributionTable from '~/components/channel/ContributionTable.vue'
import type { RunFixture } from '../../fixtures/runs'
import { copperExtension, swappedBothEnds } from '../../fixtures/runs'
import { plain, solved } from './support'

const mount = (fixture: RunFixture) =>
  mountSuspended(ContributionTable, { props: { run: fixture.run, solution: solved(fixture).solution } })

describe('ContributionTable', () => {
  it('gives each stretch leg by leg beside what belongs there', async () => {
    const rows = (await mount(copperExtension())).findAll('tbody tr').map((row) => plain(row.text()))
    expect(rows).toHaveLength(3)
    expect(rows[2]).toContain('Hook-up wire')
    expect(rows[2]).toContain('Cu / Cu')
    expect(rows[2]).toMatch(/0\.000mV\+1\.772mV$/)
  })

  it('adds up to the emf at the terminals', async () => {
    const table = await mount(copperExtension())
    expect(plain(table.find('tfoot').text())).toBe('At the terminals+5.204mV+6.976mV')
  })

  it('says where legs lie swapped', async () => {
    expect((await mount(swappedBothEnds())).text()).toContain('legs swapped')
  })

  it('scrolls within itself, by keyboard too', async () => {
    const region = (await mount(copperExtension())).find('[role="region"]')
    expect(region.attributes('tabindex')).toBe('0')
  })

  it('shows a dash where there is no figure', async () => {
    const fixture = copperExtension()
    const [climb] = fixture.states
    fixture.states = [{ ...climb, zoneCelsius: { ...climb.zoneCelsius, bay: 500 } }]
    expect((await mount(fixture)).findAll('tbody tr')[2]?.text()).toContain('–')
  })
})
