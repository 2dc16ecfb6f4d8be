import { mountSuspended, registerEndpoint } from '@nuxt/test-utils/runtime'
import { readBody, setResponseStatus } from 'h3'
import { beforeEach, describe, expect, it, vi } from 'vitest'
import type { ZoneGrid } from '#shared/types/workbook'
import ZoneGridTable from '~/components/zone/ZoneGridTable.vue'

const grid: ZoneGrid = {
  zones: [{ id: 3, version: 1, name: 'Firewall', kind: 'firewall', position: 0 }],
  states: [
    { id: 1, version: 1, name: 'Hangar', position: 0 },
    { id: 2, version: 1, name: 'Climb', position: 1 },
  ],
  temperatures: [
    { stateId: 1, zoneId: 3, celsius: 18, version: 1 },
    { stateId: 2, zoneId: 3, celsius: 58, version: 1 },
  ],
}

interface Sent {
  version: number
  celsius: number
}
let sent: Sent[] = []
let storedVersion = 1

registerEndpoint('/api/aircraft/7/states/2/temperatures/3', {
  method: 'PUT',
  handler: async (event) => {
    const body = (await readBody(event)) as Sent
    sent.push(body)
    if (body.version === storedVersion)
      return {
        temperature: { stateId: 2, zoneId: 3, celsius: body.celsius, version: body.version + 1 },
        moved: [{ channelId: 9, tag: 'EGT 2', beforeCelsius: 683, afterCelsius: 671 }],
      }
    setResponseStatus(event, 409)
    return {
      type: 'about:blank',
      title: 'Changed in the meantime',
      status: 409,
      detail: 'The builder has changed it.',
      code: 'stale-version',
      changed: {
        version: storedVersion,
        fields: [{ field: 'celsius', current: 61 }],
        changedBy: 'The builder',
        changedAt: null,
      },
    }
  },
})

beforeEach(() => {
  sent = []
  storedVersion = 1
})

async function mount(editable = true) {
  const wrapper = await mountSuspended(ZoneGridTable, {
    props: {
      grid,
      api: '/api/aircraft/7',
      editable,
      'onUpdate:grid': (next: ZoneGrid) => wrapper.setProps({ grid: next }),
    },
  })
  return wrapper
}
const climb = '[aria-label^="Firewall, Climb"]'

describe('ZoneGridTable', () => {
  it('is a table with a caption and scoped headers, each field named by zone and state', async () => {
    const table = await mount()
    expect(table.get('caption').text()).toContain('Temperature of each zone')
    expect(table.findAll('tbody th').every((cell) => cell.attributes('scope') === 'row')).toBe(true)
    expect(table.get(climb).attributes('aria-label')).toBe('Firewall, Climb, °C')
  })

  it('saves a figure when it is left, and tells which channels move', async () => {
    const table = await mount()
    await table.get(climb).setValue('70')
    await table.get(climb).trigger('blur')
    await vi.waitFor(() => expect(table.text()).toContain('● saved'))
    expect(sent).toEqual([{ version: 1, celsius: 70 }])
    expect(table.get('[aria-label="What moved"]').text()).toContain('EGT 2')
  })

  it('sends once when Enter is followed by leaving the field', async () => {
    const table = await mount()
    await table.get(climb).setValue('70')
    await table.get(climb).trigger('keydown.enter')
    await table.get(climb).trigger('blur')
    await vi.waitFor(() => expect(table.text()).toContain('● saved'))
    expect(sent).toHaveLength(1)
  })

  it('stores nothing that is no temperature, and says so', async () => {
    const table = await mount()
    await table.get(climb).setValue('warm')
    await table.get(climb).trigger('blur')
    expect(table.text()).toContain('Enter a temperature.')
    expect(sent).toEqual([])
  })

  it('asks whose figure holds when somebody else was faster', async () => {
    storedVersion = 5
    const table = await mount()
    await table.get(climb).setValue('70')
    await table.get(climb).trigger('blur')
    await vi.waitFor(() => expect(table.text()).toContain('The builder has changed it.'))
    const mine = table.findAll('button').find((button) => button.text() === 'Write mine over it')
    await mine?.trigger('click')
    await vi.waitFor(() => expect(table.text()).toContain('● saved'))
    expect(sent).toEqual([
      { version: 1, celsius: 70 },
      { version: 5, celsius: 70 },
    ])
  })

  it('shows figures without fields to those who only read', async () => {
    const table = await mount(false)
    expect(table.findAll('tbody input')).toHaveLength(0)
    expect(table.get('tbody').text()).toContain('58')
  })
})
