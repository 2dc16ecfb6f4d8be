import { mountSuspended } from '@nuxt/test-utils/runtime'
import { flushPromises } from '@vue/test-utils'
import { describe, expect, it, vi } from 'vitest'
import { defineComponent, h } from 'vue'
import { z } from 'zod'
import ErrorSummary from '~/components/form/ErrorSummary.vue'
import { ApiFailure } from '~/composables/api/useApi'
import { useZodForm } from '~/composables/useZodForm'

const schema = z.object({ name: z.string().min(1, 'Enter a name.') })

async function mountForm(send: (values: { name: string }) => Promise<void>) {
  let form: ReturnType<typeof useZodForm<typeof schema>> | undefined
  const wrapper = await mountSuspended(
    defineComponent({
      setup() {
        const made = useZodForm(schema, { name: '' }, send)
        form = made
        const name = made.field('name')
        return () => [
          h(ErrorSummary, { errors: made.errors.value, attempts: made.attempts.value }),
          h('input', {
            id: 'field-name',
            value: name.value,
            onInput: (event: Event) => (name.value = (event.target as HTMLInputElement).value),
          }),
        ]
      },
    }),
    { attachTo: document.body },
  )
  if (!form) throw new Error('not mounted')
  return { form, wrapper }
}

describe('useZodForm', () => {
  it('refuses by the schema, shows a summary and sends nothing', async () => {
    const send = vi.fn(async () => {})
    const { form, wrapper } = await mountForm(send)
    await form.submit()
    await flushPromises()
    expect(send).not.toHaveBeenCalled()
    expect(wrapper.get('[role=alert]').text()).toContain('Enter a name.')
    wrapper.unmount()
  })

  it('puts the reasons of the server at their fields and keeps what was typed', async () => {
    const { form, wrapper } = await mountForm(async () => {
      throw new ApiFailure({
        type: 'about:blank',
        title: 'Taken',
        status: 409,
        detail: 'That name is taken.',
        code: 'conflict',
        errors: [{ field: 'name', reason: 'EGT 2 is called that.' }],
      })
    })
    await wrapper.get('input').setValue('EGT 1')
    await form.submit()
    await flushPromises()
    expect(form.errorOf('name')).toBe('EGT 2 is called that.')
    expect(wrapper.get('input').element.value).toBe('EGT 1')
    wrapper.unmount()
  })

  it('sends once, however often it is asked while on its way', async () => {
    let finish = () => {}
    const send = vi.fn(() => new Promise<void>((resolve) => (finish = resolve)))
    const { form, wrapper } = await mountForm(send)
    await wrapper.get('input').setValue('EGT 1')
    const first = form.submit()
    await vi.waitFor(() => expect(send).toHaveBeenCalled())
    await form.submit()
    finish()
    await first
    expect(send).toHaveBeenCalledTimes(1)
    wrapper.unmount()
  })
})
