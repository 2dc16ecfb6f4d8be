import { mountSuspended } from '@nuxt/test-utils/runtime'
import { describe, expect, it } from 'vitest'
import CauseTable from '~/components/channel/CauseTable.vue'
import type { RunFixture } from '../../fixtures/runs'
import {
  copperExtension,
  displaySetToJ,
  rightRun,
  sixSections,
  swappedAtTerminals,
} from '../../fixtures/runs'
import { plain, solved } from './support'

async function mount(fixture: RunFixture) {
  return mountSuspended(CauseTable, { props: { run: fixture.run, solution: solved(fixture).solution } })
}

describe('CauseTable', () => {
  it('splits the error and adds it up', async () => {
    const fixture = copperExtension()
    fixture.run = { ...fixture.run, display: { ...fixture.run.display, offsetKelvin: 2 } }
    const table = await mount(fixture)
    const degrees = table.findAll('tbody tr').map((row) => plain(row.findAll('td')[2]?.text() ?? ''))
    expect(degrees).toEqual(['−44.3°C', '+2.0°C'])
    expect(plain(table.find('tfoot').text())).toContain('−42.3°C')
  })

  it('states the order in which causes are put right', async () => {
    expect((await mount(copperExtension())).text()).toContain('one at a time, from the tip to the display')
  })

  it('has no emf for what happens inside the display', async () => {
    const row = (await mount(displaySetToJ())).find('tbody tr')
    expect(row.text()).toContain('Type setting')
    expect(row.text()).toContain('inside the display')
  })

  it('off scale: microvolts only', async () => {
    const table = await mount(swappedAtTerminals())
    expect(table.findAll('thead th')).toHaveLength(2)
    expect(table.text()).toContain('In microvolts only')
    expect(plain(table.find('tfoot').text())).toContain('−13952µV')
  })

  it('says so where there is nothing to split', async () => {
    expect((await mount(rightRun())).text()).toContain('No cause of error')
  })

  it('spends no row on a foreign metal that changes nothing', async () => {
    expect((await mount(sixSections())).find('table').exists()).toBe(false)
  })
})
