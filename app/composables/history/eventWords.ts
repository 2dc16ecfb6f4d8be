import type { HistoryEvent } from '#shared/types/workbook'
import { fieldWords, valueWords } from '~/composables/record/fieldWords'

/** What the records of an aircraft are called now, by their keys. */
export interface RecordNames {
  channels: ReadonlyMap<number, string>
  zones: ReadonlyMap<number, string>
  states: ReadonlyMap<number, string>
  displays: ReadonlyMap<number, string>
}

type Snapshot = Record<string, unknown>

export interface Change {
  field: string
  before: string
  after: string
}

const DEEDS: Record<string, string> = {
  created: 'created',
  updated: 'changed',
  deleted: 'removed',
  archived: 'archived',
  restored: 'restored',
  granted: 'given roles',
  set: 'set',
  logged: 'logged',
  removed: 'removed',
  saved: 'saved',
}

/** Keys and counters of the database: true, and of no use to a reader. */
const UNTOLD = new Set(['id', 'version', 'position', 'channelId', 'userId'])

function text(snapshot: Snapshot, field: string): string | undefined {
  const value = snapshot[field]
  return typeof value === 'string' && value !== '' ? value : undefined
}

function named(names: ReadonlyMap<number, string>, id: unknown, otherwise: string): string {
  return (typeof id === 'number' ? names.get(id) : undefined) ?? otherwise
}

function subject(event: HistoryEvent, snapshot: Snapshot, names: RecordNames): string {
  const channel = () => named(names.channels, snapshot.channelId, 'a channel since removed')
  switch (event.entity) {
    case 'channel':
      return `Channel ${text(snapshot, 'tag') ?? ''}`
    case 'probe':
      return `Probe of ${channel()}`
    case 'run':
      return `Wiring run of ${channel()}`
    case 'temperature':
      return `${named(names.zones, snapshot.zoneId, 'A zone since removed')} in ${named(names.states, snapshot.stateId, 'a state since removed')}`
    case 'zone':
      return `Zone ${text(snapshot, 'name') ?? ''}`
    case 'state':
      return `Operating state ${text(snapshot, 'name') ?? ''}`
    case 'display':
      return `Display ${text(snapshot, 'name') ?? ''}`
    case 'membership':
      return 'A person'
    default:
      return 'Aircraft'
  }
}

/** What happened to which record, e.g. "Wiring run of EGT 2 saved". */
export function eventTitle(event: HistoryEvent, names: RecordNames): string {
  const deed = event.action.slice(event.action.indexOf('.') + 1)
  return `${subject(event, event.after ?? event.before ?? {}, names)} ${DEEDS[deed] ?? deed.replaceAll('-', ' ')}`
}

/** A field of an event: keys of zones and displays are told by name. */
function told(field: string, value: unknown, names: RecordNames): string {
  if (value !== null && field.endsWith('ZoneId')) return named(names.zones, value, 'a zone since removed')
  if (value !== null && field === 'displayId') return named(names.displays, value, 'a display since removed')
  return valueWords(value)
}

/** The fields an event altered, in words. */
export function eventChanges(event: HistoryEvent, names: RecordNames): Change[] {
  const before = event.before ?? {}
  const after = event.after ?? {}
  const same = (field: string) => JSON.stringify(before[field]) === JSON.stringify(after[field])
  return [...new Set([...Object.keys(before), ...Object.keys(after)])]
    .filter((field) => !UNTOLD.has(field) && !same(field))
    .map((field) => ({
      field: fieldWords(field),
      before: event.before ? told(field, before[field], names) : '',
      after: event.after ? told(field, after[field], names) : '',
    }))
}
