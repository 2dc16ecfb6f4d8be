import { mountSuspended } from '@nuxt/test-utils/runtime'
import { afterEach, describe, expect, it } from 'vitest'
import { nextTick } from 'vue'
import type { ChannelRow, OperatingState } from '#shared/types/workbook'
import ChannelDataTable from '~/components/table/ChannelDataTable.vue'
import { DEFAULT_PREFERENCES, useUnitsStore } from '~/stores/units'

const states: OperatingState[] = [
  { id: 1, version: 1, name: 'Hangar', position: 0 },
  { id: 2, version: 1, name: 'Climb', position: 1 },
]

function row(id: number, tag: string, climbCelsius: number | null, errorKelvin: number | null): ChannelRow {
  const fault = errorKelvin !== 0
  return {
    channel: {
      id,
      version: 1,
      position: id,
      tag,
      quantity: 'exhaust-gas-temperature',
      cylinder: null,
      sensor: 'thermocouple',
      thermocoupleType: 'K',
      tipZoneId: 1,
      displayId: 1,
      inputNumber: id,
      typeSetting: 'K',
      workingLowCelsius: null,
      workingHighCelsius: null,
      notes: '',
    },
    displayName: 'Display',
    hasProbe: true,
    hasRun: true,
    standing: fault ? 'faults' : 'as-intended',
    readings: [
      {
        channelId: id,
        stateId: 2,
        tipCelsius: 700,
        terminalMillivolts: 28,
        indication:
          climbCelsius === null
            ? { kind: 'off-scale-low', limitCelsius: -270 }
            : { kind: 'value', celsius: climbCelsius },
        errorKelvin,
        findingCodes: fault ? ['stray-junction'] : [],
      },
    ],
    worstErrorKelvin: errorKelvin === null ? null : Math.abs(errorKelvin),
    findingCodes: fault ? ['stray-junction'] : [],
  }
}

const rows = [row(1, 'EGT 1', 700, 0), row(2, 'EGT 2', 660, -40), row(3, 'EGT 10', null, null)]

const mount = () => mountSuspended(ChannelDataTable, { props: { rows, states, path: '/aircraft/1' } })
const tags = (table: Awaited<ReturnType<typeof mount>>) =>
  table.findAll('tbody th[scope=row]').map((cell) => cell.text())

afterEach(() => useUnitsStore().use(DEFAULT_PREFERENCES))

describe('ChannelDataTable', () => {
  it('is a table with a caption, scoped headers and links', async () => {
    const table = await mount()
    expect(table.get('caption').text()).toContain('expected reading')
    expect(table.findAll('thead th').every((cell) => cell.attributes('scope') === 'col')).toBe(true)
    expect(table.get('tbody th a').attributes('href')).toBe('/aircraft/1/channels/1')
  })

  it('shows readings in the unit chosen, and off scale in words', async () => {
    useUnitsStore().use({ ...DEFAULT_PREFERENCES, temperatureUnit: 'fahrenheit' })
    const text = (await mount()).get('table').text()
    expect(text).toContain('1292\u00a0°F')
    expect(text).toContain('−72.0\u00a0°F')
    expect(text).toContain('off scale, low')
  })

  it('sorts by a column and says so; what has no figure stays last', async () => {
    const table = await mount()
    const header = table.findAll('thead th').find((cell) => cell.text().startsWith('Climb'))
    await header?.get('button').trigger('click')
    const first = tags(table)
    await header?.get('button').trigger('click')
    const second = tags(table)
    expect([first, second].map((order) => order.at(-1))).toEqual(['EGT 10', 'EGT 10'])
    expect(first.slice(0, 2)).toEqual(second.slice(0, 2).toReversed())
    expect(header?.attributes('aria-sort')).toMatch(/ascending|descending/)
  })

  it('finds by tag and by standing, and says when nothing fits', async () => {
    const table = await mount()
    await table.get('input[name=filter]').setValue('egt 2')
    expect(tags(table)).toEqual(['EGT 2'])
    await table.get('input[name=filter]').setValue('nothing')
    await nextTick()
    expect(table.text()).toContain('No channel fits this filter')
  })
})
