import type { Row, SortingState, Updater, VisibilityState } from '@tanstack/vue-table'
import { getCoreRowModel, getSortedRowModel, useVueTable } from '@tanstack/vue-table'
import { QUANTITY_WORDS } from '#shared/domain/wording'
import { QUANTITIES } from '#shared/schemas/aircraft'
import type { ChannelRow, ChannelStanding, OperatingState } from '#shared/types/workbook'
import { channelColumns } from '~/composables/table/channelColumns'
import { useReadingText } from '~/composables/table/useReadingText'

function update<State>(updater: Updater<State>, state: Ref<State>): void {
  state.value = typeof updater === 'function' ? (updater as (old: State) => State)(state.value) : updater
}

function searchText({ channel, displayName }: ChannelRow): string {
  return [channel.tag, QUANTITY_WORDS[channel.quantity], displayName ?? ''].join(' ').toLowerCase()
}

/** Sorting, filtering, grouping and the choice of columns (kept in this browser) of the channel table. */
export function useChannelTable(source: { rows: readonly ChannelRow[]; states: readonly OperatingState[] }) {
  const texts = useReadingText()
  const filter = ref('')
  const standing = ref<ChannelStanding | 'all'>('all')
  const grouped = ref(true)
  const sorting = ref<SortingState>([])
  const visibility = useCookie<VisibilityState>('cowlbook-channel-columns', {
    default: () => ({ quantity: false }),
    sameSite: 'lax',
    maxAge: 365 * 24 * 3600,
  })

  const rows = computed(() => {
    const words = filter.value.trim().toLowerCase()
    return source.rows.filter(
      (row) =>
        (standing.value === 'all' || row.standing === standing.value) && searchText(row).includes(words),
    )
  })
  const columns = computed(() => channelColumns(source.states, texts))

  const table = useVueTable({
    get data() {
      return rows.value
    },
    get columns() {
      return columns.value
    },
    state: {
      get sorting() {
        return sorting.value
      },
      get columnVisibility() {
        return visibility.value
      },
    },
    onSortingChange: (updater) => update(updater, sorting),
    onColumnVisibilityChange: (updater) => update(updater, visibility),
    getRowId: (row) => String(row.channel.id),
    getCoreRowModel: getCoreRowModel(),
    getSortedRowModel: getSortedRowModel(),
  })

  const groups = computed<{ title: string; rows: Row<ChannelRow>[] }[]>(() => {
    const sorted = table.getRowModel().rows
    if (!grouped.value) return [{ title: '', rows: sorted }]
    return QUANTITIES.map((quantity) => ({
      title: QUANTITY_WORDS[quantity],
      rows: sorted.filter((row) => row.original.channel.quantity === quantity),
    })).filter((group) => group.rows.length > 0)
  })

  const columnChoices = computed(() =>
    table
      .getAllLeafColumns()
      .filter((column) => column.getCanHide())
      .map((column) => ({
        id: column.id,
        title: String(column.columnDef.header),
        shown: column.getIsVisible(),
        toggle: () => column.toggleVisibility(),
      })),
  )
  const standings = computed(() => [...new Set(source.rows.map((row) => row.standing))])

  return { table, filter, standing, standings, grouped, groups, columnChoices }
}
