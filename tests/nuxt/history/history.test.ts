import { mountSuspended } from '@nuxt/test-utils/runtime'
import { describe, expect, it } from 'vitest'
import type { HistoryEvent } from '#shared/types/workbook'
import HistoryEntry from '~/components/history/HistoryEntry.vue'
import type { RecordNames } from '~/composables/history/eventWords'
import { eventChanges, eventTitle } from '~/composables/history/eventWords'

const names: RecordNames = {
  channels: new Map([[9, 'EGT 2']]),
  zones: new Map([[3, 'Firewall']]),
  states: new Map([[2, 'Climb']]),
  displays: new Map([[1, 'Engine monitor']]),
}

function happened(change: Partial<HistoryEvent>): HistoryEvent {
  return {
    sequence: 12,
    at: '2026-05-01T10:30:12.000Z',
    actorId: 1,
    actorName: 'Orla',
    action: 'temperature.set',
    entity: 'temperature',
    entityId: 3,
    before: { stateId: 2, zoneId: 3, celsius: 58, version: 1 },
    after: { stateId: 2, zoneId: 3, celsius: 61, version: 2 },
    hash: 'abc',
    ...change,
  }
}

describe('the words of an event', () => {
  it.each([
    [{}, 'Firewall in Climb set'],
    [
      { action: 'run.saved', entity: 'run', before: null, after: { channelId: 9 } },
      'Wiring run of EGT 2 saved',
    ],
    [
      { action: 'probe.removed', entity: 'probe', before: { channelId: 4 }, after: null },
      'Probe of a channel since removed removed',
    ],
    [
      { action: 'channel.updated', entity: 'channel', before: {}, after: { tag: 'CHT 1' } },
      'Channel CHT 1 changed',
    ],
    [{ action: 'aircraft.created', entity: 'aircraft', before: null, after: {} }, 'Aircraft created'],
  ])('%o', (change, title) => {
    expect(eventTitle(happened(change), names)).toBe(title)
  })

  it('tell what changed and nothing else', () => {
    expect(eventChanges(happened({}), names)).toEqual([{ field: 'celsius', before: '58', after: '61' }])
  })

  it('name the display and the zone behind a key, and count parts', () => {
    const after = {
      displayId: 1,
      tipZoneId: 3,
      sections: [{}, {}],
      compensation: { kind: 'none' },
      notes: '',
    }
    const event = happened({ action: 'channel.created', entity: 'channel', before: null, after })
    expect(eventChanges(event, names).map(({ field, after: text }) => [field, text])).toEqual([
      ['display', 'Engine monitor'],
      ['tip zone', 'Firewall'],
      ['sections', '2'],
      ['compensation', 'kind none'],
      ['notes', '–'],
    ])
  })
})

describe('HistoryEntry', () => {
  it('says when, what and who; details unfold', async () => {
    const entry = await mountSuspended(HistoryEntry, { props: { event: happened({}), names } })
    expect(entry.get('time').attributes('datetime')).toBe('2026-05-01T10:30:12.000Z')
    expect(entry.text()).toContain('2026-05-01 10:30 UTC')
    expect(entry.get('summary').attributes('aria-label')).toContain('Firewall in Climb set')
    expect(entry.get('dl').text()).toContain('58 → 61')
  })

  it('says so when the account of the person is gone', async () => {
    const entry = await mountSuspended(HistoryEntry, {
      props: { event: happened({ actorName: null }), names },
    })
    expect(entry.text()).toContain('account is gone')
  })
})
