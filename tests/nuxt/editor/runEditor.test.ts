import { mountSuspended } from '@nuxt/test-utils/runtime'
import { beforeEach, describe, expect, it } from 'vitest'
import { nextTick } from 'vue'
import EditNumber from '~/components/run/editor/EditNumber.vue'
import RunEditor from '~/components/run/editor/RunEditor.vue'
import RunWorkbench from '~/components/run/editor/RunWorkbench.vue'
import SaveBar from '~/components/run/editor/SaveBar.vue'
import { sandboxRun } from '~/composables/run/sandboxRun'
import { useRunEditorStore } from '~/stores/runEditor'

beforeEach(() => {
  const { surroundings, parts } = sandboxRun('K')
  useRunEditorStore().open(surroundings, parts, 3)
})

describe('the store of the run being edited', () => {
  it('undoes and redoes, and forgets what was undone once something else is done', () => {
    const editor = useRunEditorStore()
    const first = editor.parts
    if (!first) throw new Error('no run')
    const second = { ...first, terminals: { ...first.terminals, crossed: true } }
    editor.change(second)
    expect(editor.changed).toBe(true)
    editor.undo()
    expect(editor.parts).toBe(first)
    expect(editor.changed).toBe(false)
    editor.redo()
    expect(editor.parts).toBe(second)
    editor.undo()
    editor.change({ ...first })
    expect(editor.canRedo).toBe(false)
  })

  it('counts edits made during a save as edits', () => {
    const editor = useRunEditorStore()
    const sent = editor.parts
    if (!sent) throw new Error('no run')
    editor.change({ ...sent })
    editor.markSaved(sent, 4)
    expect(editor.version).toBe(4)
    expect(editor.changed).toBe(true)
  })
})

describe('what leaving the page would lose', () => {
  it('is nothing of a run only proposed, and everything drawn since', () => {
    const editor = useRunEditorStore()
    const { surroundings, parts } = sandboxRun('K')
    editor.open(surroundings, parts, null)
    expect(editor.unsaved).toBe(false)
    editor.change({ ...parts })
    expect(editor.unsaved).toBe(true)
    editor.undo()
    expect(editor.unsaved).toBe(false)
  })

  it('is nothing of a stored run as it stands, and everything changed since', () => {
    const editor = useRunEditorStore()
    expect(editor.unsaved).toBe(false)
    if (!editor.parts) throw new Error('no run')
    const drawn = { ...editor.parts }
    editor.change(drawn)
    expect(editor.unsaved).toBe(true)
    editor.markSaved(drawn, 4)
    expect(editor.unsaved).toBe(false)
  })
})

describe('RunEditor', () => {
  it('lists the parts from tip to terminals and opens one at a time', async () => {
    const list = await mountSuspended(RunEditor, { props: { stateId: 'climb' } })
    const titles = list.findAll('ol > li > button').map((button) => button.findAll('span')[1]?.text())
    expect(titles).toEqual(['Probe', 'Plug pair', 'Extension', 'Terminals of Display', 'Zone temperatures'])
    const extension = list.findAll('ol > li > button')[2]
    await extension?.trigger('click')
    expect(extension?.attributes('aria-expanded')).toBe('true')
    expect(list.text()).toContain('Swap the legs at both ends')
  })
})

describe('RunWorkbench', () => {
  it('moves every figure at once when the cable is changed', async () => {
    const bench = await mountSuspended(RunWorkbench)
    expect(bench.text()).toContain('Nothing found in the record')
    const editor = useRunEditorStore()
    editor.selected = `section:${editor.parts?.sections[1]?.id ?? ''}`
    await nextTick()
    const cable = bench.findAll('select').find((select) => select.html().includes('Copper pair'))
    await cable?.setValue('copper')
    expect(bench.text()).not.toContain('Nothing found in the record')
    expect(bench.text()).toContain('Error by cause')
  })
})

describe('EditNumber', () => {
  async function mountNumber() {
    return mountSuspended(EditNumber, {
      props: { modelValue: 5, label: 'Length', unit: 'm', low: 0, high: 200 },
    })
  }

  it('hands over numbers within bounds, with a decimal comma if need be', async () => {
    const number = await mountNumber()
    await number.get('input').setValue('2,5')
    expect(number.emitted('update:modelValue')).toEqual([[2.5]])
  })

  it.each([
    ['abc', 'Enter a number.'],
    ['201', 'Enter 0 to 200.'],
    ['', 'Enter a number.'],
  ])('names what is wrong with %j and hands nothing over', async (text, reason) => {
    const number = await mountNumber()
    await number.get('input').setValue(text)
    expect(number.emitted('update:modelValue')).toBeUndefined()
    expect(number.text()).toContain(reason)
    expect(number.get('input').attributes('aria-invalid')).toBe('true')
  })
})

describe('EditNumber, changed from elsewhere', () => {
  it('drops what was wrong with the figure typed before', async () => {
    const number = await mountSuspended(EditNumber, {
      props: { modelValue: 5, label: 'Length', unit: 'm', low: 0, high: 200 },
    })
    await number.get('input').setValue('7x')
    await number.setProps({ modelValue: 6 })
    expect(number.get('input').element.value).toBe('6')
    expect(number.get('input').attributes('aria-invalid')).toBeUndefined()
  })
})

describe('SaveBar', () => {
  it('says who saved in the meantime and offers both ways out', async () => {
    const bar = await mountSuspended(SaveBar, {
      props: {
        state: 'failed',
        doneTo: '/aircraft',
        problem: {
          type: 'about:blank',
          title: 'Changed meanwhile',
          status: 409,
          detail: 'This run was changed.',
          code: 'stale-version',
          changed: {
            version: 9,
            fields: [{ field: 'joints', current: [] }],
            changedBy: 'A. Builder',
            changedAt: null,
          },
        },
      },
    })
    expect(bar.text()).toContain('A. Builder saved this run in the meantime. Changed: joints.')
    const button = (name: string) => bar.findAll('button').find((one) => one.text() === name)
    await button('Take theirs and drop mine')?.trigger('click')
    await button('Save mine over theirs')?.trigger('click')
    expect(bar.emitted('takeTheirs')).toHaveLength(1)
    expect(bar.emitted('saveOver')).toHaveLength(1)
  })
})
