import { mountSuspended } from '@nuxt/test-utils/runtime'
import { describe, expect, it } from 'vitest'
import SheetFrame from '~/components/sheet/SheetFrame.vue'
import TitleBlock from '~/components/sheet/TitleBlock.vue'
import AppButton from '~/components/ui/AppButton.vue'
import ConfirmDialog from '~/components/ui/ConfirmDialog.vue'
import Notice from '~/components/ui/Notice.vue'
import ProgressNote from '~/components/ui/ProgressNote.vue'
import StatusMark from '~/components/ui/StatusMark.vue'

describe('status', () => {
  it.each([
    ['good', '●'],
    ['open', '○'],
    ['trouble', '▲'],
    ['record', '–'],
  ] as const)('%s is a shape and a word, not a colour alone', async (status, shape) => {
    const mark = await mountSuspended(StatusMark, { props: { status }, slots: { default: () => 'Word' } })
    expect(mark.get('[aria-hidden=true]').text()).toBe(shape)
    expect(mark.text()).toContain('Word')
  })

  it('trouble is announced, a note is not', async () => {
    const slots = { default: () => 'text' }
    expect((await mountSuspended(Notice, { props: { kind: 'trouble' }, slots })).attributes('role')).toBe(
      'alert',
    )
    expect((await mountSuspended(Notice, { slots })).attributes('role')).toBeUndefined()
  })

  it('a save says politely how it stands', async () => {
    const note = await mountSuspended(ProgressNote, { props: { state: 'failed' } })
    expect(note.attributes('aria-live')).toBe('polite')
    expect(note.text()).toBe('▲ Not saved')
  })
})

describe('buttons', () => {
  it('lead somewhere or do something', async () => {
    const slots = { default: () => 'Go' }
    expect(
      (await mountSuspended(AppButton, { props: { to: '/bench' }, slots })).get('a').attributes('href'),
    ).toBe('/bench')
    expect((await mountSuspended(AppButton, { slots })).get('button').attributes('type')).toBe('button')
  })

  it('a busy one says so', async () => {
    const button = await mountSuspended(AppButton, { props: { busy: true }, slots: { default: () => 'Go' } })
    expect(button.get('button').attributes('aria-busy')).toBe('true')
  })

  it('that destroy ask first', async () => {
    const dialog = await mountSuspended(ConfirmDialog, {
      props: { title: 'Delete EGT 1?', action: 'Delete it' },
      slots: { default: () => 'Gone for good.' },
    })
    const [keep, agree] = dialog.findAll('button')
    await keep?.trigger('click')
    expect(dialog.emitted('confirm')).toBeUndefined()
    await agree?.trigger('click')
    expect(dialog.emitted('confirm')).toHaveLength(1)
  })
})

describe('the sheet', () => {
  it('has a name, and a title block where one is given', async () => {
    const sheet = await mountSuspended(SheetFrame, {
      props: { label: 'Channel sheet' },
      slots: { default: () => 'content', 'title-block': () => 'block' },
    })
    expect(sheet.get('section').attributes('aria-label')).toBe('Channel sheet')
    expect(sheet.text()).toContain('block')
  })

  it('lists what a title block states', async () => {
    const block = await mountSuspended(TitleBlock, { props: { rows: [{ label: 'Tag', value: 'EGT 3' }] } })
    expect(block.get('dt').text()).toBe('Tag')
    expect(block.get('dd').text()).toBe('EGT 3')
  })
})
