import { registerEndpoint } from '@nuxt/test-utils/runtime'
import { flushPromises } from '@vue/test-utils'
import { readBody, setResponseStatus } from 'h3'
import { describe, expect, it, vi } from 'vitest'
import Administration from '~/components/aircraft/Administration.vue'
import SettingsForm from '~/components/aircraft/SettingsForm.vue'
import { aircraftSheet, mountOn } from './support'

describe('SettingsForm', () => {
  it('shows what somebody else stored first, and writes over it only when told to', async () => {
    const versions: number[] = []
    registerEndpoint('/api/aircraft/7', {
      method: 'PATCH',
      handler: async (event) => {
        const { version } = (await readBody(event)) as { version: number }
        versions.push(version)
        if (version === 4) return { aircraft: {} }
        setResponseStatus(event, 409)
        return {
          type: 'about:blank',
          title: 'Changed in the meantime',
          status: 409,
          detail: 'The builder has changed the aircraft since you opened it.',
          code: 'stale-version',
          changed: {
            version: 4,
            fields: [{ field: 'registration', current: 'DEMO-2' }],
            changedBy: 'The builder',
            changedAt: null,
          },
        }
      },
    })
    const { wrapper } = await mountOn(SettingsForm, aircraftSheet())
    await wrapper.get('input[name=name]').setValue('My own name')
    await wrapper.get('form').trigger('submit')
    await vi.waitFor(() => expect(wrapper.text()).toContain('The builder saved this first'))
    expect(wrapper.get('dl').text()).toContain('DEMO-2')
    expect((wrapper.get('input[name=name]').element as HTMLInputElement).value).toBe('My own name')

    const over = wrapper.findAll('button').find((button) => button.text() === 'Save mine over theirs')
    await over?.trigger('click')
    await vi.waitFor(() => expect(wrapper.text()).toContain('● Saved'))
    expect(versions).toEqual([3, 4])
  })
})

describe('Administration', () => {
  it('archives with the version it was based on and loads the aircraft anew', async () => {
    const seen: unknown[] = []
    registerEndpoint('/api/aircraft/7/archive', {
      method: 'POST',
      handler: async (event) => {
        seen.push(await readBody(event))
        return { aircraft: {} }
      },
    })
    const reload = vi.fn()
    const { wrapper } = await mountOn(Administration, aircraftSheet(), reload)
    await wrapper
      .findAll('button')
      .find((button) => button.text() === 'Archive')
      ?.trigger('click')
    await vi.waitFor(() => expect(reload).toHaveBeenCalled())
    expect(seen).toEqual([{ version: 3 }])
  })

  it('says why a deletion was refused', async () => {
    registerEndpoint('/api/aircraft/7', {
      method: 'DELETE',
      handler: (event) => {
        setResponseStatus(event, 409)
        return {
          type: 'about:blank',
          title: 'Conflict',
          status: 409,
          detail: 'It was archived in the meantime.',
          code: 'conflict',
        }
      },
    })
    const { wrapper } = await mountOn(Administration, aircraftSheet())
    await wrapper
      .findAll('dialog button')
      .find((button) => button.text() === 'Delete it for good')
      ?.trigger('click')
    await flushPromises()
    await vi.waitFor(() =>
      expect(wrapper.get('[role=alert]').text()).toContain('It was archived in the meantime.'),
    )
  })
})
