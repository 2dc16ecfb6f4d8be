import { mountSuspended } from '@nuxt/test-utils/runtime'
import type { Component } from 'vue'
import { defineComponent, h, ref } from 'vue'
import type { AircraftSheet, ChannelStanding } from '#shared/types/workbook'
import { CHANNEL_STANDINGS } from '#shared/types/workbook'
import { provideAircraft } from '~/composables/aircraft/useAircraft'

/** Counts by standing: nothing but what is named. */
export function counts(named: Partial<Record<ChannelStanding, number>>): Record<ChannelStanding, number> {
  const none = Object.fromEntries(CHANNEL_STANDINGS.map((standing) => [standing, 0])) as Record<
    ChannelStanding,
    number
  >
  return { ...none, ...named }
}

/** An aircraft of four channels, in the state the test is about. */
export function aircraftSheet(change: Partial<AircraftSheet> = {}): AircraftSheet {
  return {
    aircraft: {
      id: 7,
      version: 3,
      name: 'Two-seat project',
      registration: 'DEMO',
      cableStandard: 'astm-e230',
      layout: { cylinders: 4, cooling: 'air', ignition: 'two-magnetos', quantities: ['oil-temperature'] },
      archivedAt: null,
      createdAt: '2026-05-01T10:00:00.000Z',
    },
    roles: ['owner', 'builder'],
    channels: 4,
    standings: counts({ faults: 1, 'as-intended': 3 }),
    people: [],
    states: [],
    ...change,
  }
}

/** Mounts a component with the pages of one aircraft around it. */
export async function mountOn(component: Component, sheet: AircraftSheet, reload: () => void = () => {}) {
  const stored = ref(sheet)
  const wrapper = await mountSuspended(
    defineComponent({
      setup() {
        provideAircraft({ sheet: stored, refresh: async () => reload() })
        return () => h(component)
      },
    }),
  )
  return { wrapper, stored }
}
