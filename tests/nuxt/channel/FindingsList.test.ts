import { mountSuspended } from '@nuxt/test-utils/runtime'
import { describe, expect, it } from 'vitest'
import FindingsList from '~/components/channel/FindingsList.vue'
import type { RunFixture } from '../../fixtures/runs'
import { copperExtension, rightRun, sixSections } from '../../fixtures/runs'
import { plain, solved } from './support'

async function mount(fixture: RunFixture) {
  const { findings } = solved(fixture).solution
  return mountSuspended(FindingsList, { props: { run: fixture.run, findings } })
}

describe('FindingsList', () => {
  it('tells what was found and what to do', async () => {
    const text = plain((await mount(copperExtension())).text())
    expect(text).toContain('Stray junction at the plug pair, positive leg')
    expect(text).toContain('What to do: Replace the section by type K cable')
  })

  it('gives severity in a word and a shape', async () => {
    const heading = (text: string) => plain(text).slice(0, 8)
    const faults = (await mount(copperExtension())).findAll('ol h3').map((h3) => heading(h3.text()))
    expect(faults).toEqual(['▲ Fault:', '▲ Fault:'])
    const notes = (await mount(sixSections())).findAll('ol h3').map((h3) => heading(h3.text()))
    expect(notes).toEqual(['○ Note: '])
  })

  it('reads each caution once, at the end', async () => {
    const list = await mount(copperExtension())
    const cautions = list.findAll('ul li').map((item) => item.text())
    expect(new Set(cautions).size).toBe(cautions.length)
    expect(cautions).toContain('Disconnect battery and display before resistance checks.')
  })

  it('says what an empty list proves and what it does not', async () => {
    const text = (await mount(rightRun())).text()
    expect(text).toContain('Nothing found in the record')
    expect(text).toContain('Only checks on the aircraft prove the channel')
    expect(text).toContain('when cold proves nothing')
  })

  it('lights the place a finding speaks of', async () => {
    const list = await mount(copperExtension())
    await list.findAll('ol > li')[1]?.trigger('pointerenter')
    expect(list.emitted('update:hovered')).toEqual([['joint:plug']])
  })
})
