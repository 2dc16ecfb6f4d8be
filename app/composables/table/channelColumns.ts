import type { ColumnDef, RowData } from '@tanstack/vue-table'
import { createColumnHelper } from '@tanstack/vue-table'
import { QUANTITY_WORDS, SENSOR_WORDS, STANDING_WORDS } from '#shared/domain/wording'
import type { ChannelRow, OperatingState } from '#shared/types/workbook'
import { CHANNEL_STANDINGS } from '#shared/types/workbook'
import { NO_VALUE } from '#shared/units'
import type { useReadingText } from '~/composables/table/useReadingText'

declare module '@tanstack/vue-table' {
  interface ColumnMeta<TData extends RowData, TValue> {
    /** Numbers: set right, in tabular figures. */
    figure?: boolean
    /** Keeps the type parameters that the library's own declaration has. */
    readonly of?: [TData, TValue]
  }
}

type Texts = ReturnType<typeof useReadingText>

function sensorText({ channel }: ChannelRow): string {
  return channel.thermocoupleType ? `Type ${channel.thermocoupleType}` : SENSOR_WORDS[channel.sensor]
}

function inputText({ channel, displayName }: ChannelRow): string {
  return displayName === null ? NO_VALUE : `${displayName}, ${channel.inputNumber ?? NO_VALUE}`
}

function shownCelsius(row: ChannelRow, stateId: number): number | undefined {
  const indication = row.readings.find((reading) => reading.stateId === stateId)?.indication
  return indication?.kind === 'value' ? indication.celsius : undefined
}

/** Columns of the channel table: what the channel is, one reading for each state, what is wrong. */
export function channelColumns(
  states: readonly OperatingState[],
  texts: Texts,
): ColumnDef<ChannelRow, unknown>[] {
  const helper = createColumnHelper<ChannelRow>()
  const columns = [
    helper.accessor((row) => row.channel.tag, {
      id: 'tag',
      header: 'Channel',
      sortingFn: 'alphanumeric',
      enableHiding: false,
    }),
    helper.accessor((row) => QUANTITY_WORDS[row.channel.quantity], { id: 'quantity', header: 'Quantity' }),
    helper.accessor(sensorText, { id: 'sensor', header: 'Sensor' }),
    helper.accessor(inputText, { id: 'input', header: 'Display input', sortingFn: 'alphanumeric' }),
    ...states.map((state) =>
      helper.accessor((row) => shownCelsius(row, state.id), {
        id: `state-${state.id}`,
        header: state.name,
        sortUndefined: 'last',
        cell: ({ row }) => texts.readingText(row.original, state.id),
        meta: { figure: true },
      }),
    ),
    helper.accessor((row) => row.worstErrorKelvin ?? undefined, {
      id: 'error',
      header: 'Worst error',
      sortUndefined: 'last',
      cell: ({ row }) => texts.errorText(row.original) || NO_VALUE,
      meta: { figure: true },
    }),
    helper.accessor((row) => texts.findingText(row), {
      id: 'findings',
      header: 'Findings',
      // Never an empty cell: a component that renders nothing does not match what the server sent.
      cell: ({ row }) => texts.findingText(row.original) || NO_VALUE,
    }),
    helper.accessor((row) => CHANNEL_STANDINGS.indexOf(row.standing), {
      id: 'standing',
      header: 'Standing',
      cell: ({ row }) => STANDING_WORDS[row.original.standing],
    }),
  ]
  return columns as ColumnDef<ChannelRow, unknown>[]
}
