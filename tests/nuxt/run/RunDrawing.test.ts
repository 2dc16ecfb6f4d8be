import { mountSuspended } from '@nuxt/test-utils/runtime'
import { describe, expect, it } from 'vitest'
import RunDrawing from '~/components/run/RunDrawing.vue'
import type { RunFixture } from '../../fixtures/runs'
import { copperExtension, RUN_FIXTURES, rightRun, swappedBothEnds } from '../../fixtures/runs'
import { solved } from '../channel/support'

function mount(fixture: RunFixture, props: { selected?: string | null } = {}) {
  const { solution } = solved(fixture)
  return mountSuspended(RunDrawing, {
    props: { view: { ...fixture, conditions: fixture.states[0], solution }, ...props },
  })
}

describe('RunDrawing', () => {
  it('draws the run for a wide and for a narrow sheet', async () => {
    const drawing = await mount(rightRun())
    expect(drawing.findAll('svg').map((svg) => svg.attributes('aria-label'))).toEqual([
      'Drawing of the run',
      'Drawing of the run',
    ])
  })

  it('carries no inline style, which the content security policy would refuse', async () => {
    for (const build of Object.values(RUN_FIXTURES))
      expect((await mount(build())).html()).not.toContain('style=')
  })

  it('offers every part as a button with its name in words, tip to display', async () => {
    const [wide] = (await mount(copperExtension())).findAll('svg')
    const buttons = wide?.findAll('[role="button"]') ?? []
    expect(buttons.map((button) => button.attributes('data-part'))).toEqual([
      'tip',
      'section:probe',
      'joint:plug',
      'section:extension',
      'terminals',
      'display',
    ])
    expect(buttons[1]?.attributes('aria-label')).toMatch(/^Section 1, Probe lead: KP positive, KN negative/)
    expect(buttons.every((button) => button.attributes('tabindex') === '0')).toBe(true)
  })

  it('chooses a part by click, Enter and Space, and lets it go again', async () => {
    const drawing = await mount(rightRun())
    const part = drawing.find('[data-part="joint:plug"]')
    await part.trigger('click')
    expect(part.attributes('aria-pressed')).toBe('true')
    await part.trigger('keydown.enter')
    expect(part.attributes('aria-pressed')).toBe('false')
    await part.trigger('keydown.space')
    expect(drawing.emitted('update:selected')).toEqual([['joint:plug'], [null], ['joint:plug']])
  })

  it('tells of the part in focus below the drawing', async () => {
    const drawing = await mount(rightRun())
    await drawing.find('[data-part="section:extension"]').trigger('focus')
    expect(drawing.emitted('update:hovered')).toEqual([['section:extension']])
    expect(drawing.find('figcaption ~ p').text()).toContain('Section 2, Extension cable')
    await drawing.find('[data-part="section:extension"]').trigger('blur')
    expect(drawing.find('figcaption ~ p').text()).toContain('Point at a part')
  })

  it('lights the part that was chosen elsewhere', async () => {
    const drawing = await mount(rightRun(), { selected: 'section:probe' })
    expect(drawing.find('[data-part="section:probe"] rect').classes()).toContain('stroke-ink')
    expect(drawing.find('[data-part="tip"] rect').classes()).toContain('stroke-transparent')
  })

  it('marks stray junctions with a shape and figures, not by colour alone', async () => {
    const [wide] = (await mount(copperExtension())).findAll('svg')
    expect(wide?.findAll('[data-stray]')).toHaveLength(2)
    expect(wide?.text()).toMatch(/−\d+\u00a0µV/)
    expect((await mount(rightRun())).findAll('[data-stray]')).toHaveLength(0)
  })

  it('draws swapped legs crossing, and says so', async () => {
    const [wide] = (await mount(swappedBothEnds())).findAll('svg')
    expect(wide?.findAll('[data-crossing]')).toHaveLength(2)
    expect(wide?.text()).toContain('legs swapped')
  })

  it('has the run in words beside the drawing', async () => {
    const drawing = await mount(swappedBothEnds())
    const words = drawing.findAll('details li').map((item) => item.text())
    expect(words).toHaveLength(6)
    expect(words[2]).toContain('conductors crossed, legs swapped here')
  })
})
