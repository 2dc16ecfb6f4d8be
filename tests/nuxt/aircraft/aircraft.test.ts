import { mountSuspended } from '@nuxt/test-utils/runtime'
import { describe, expect, it } from 'vitest'
import { layOutEngine } from '#shared/domain/engineLayout'
import AircraftListRow from '~/components/aircraft/AircraftListRow.vue'
import LayoutPreview from '~/components/aircraft/LayoutPreview.vue'
import Standings from '~/components/aircraft/Standings.vue'
import SubNavigation from '~/components/aircraft/SubNavigation.vue'
import { aircraftSheet, counts } from './support'

describe('AircraftListRow', () => {
  it('says who one is, where the channels stand and what comes next', async () => {
    const row = await mountSuspended(AircraftListRow, { props: { item: aircraftSheet() } })
    expect(row.get('a').attributes('href')).toBe('/aircraft/7')
    expect(row.text()).toContain('you are owner, builder')
    expect(row.text()).toContain('3 as intended')
    expect(row.text()).toContain('Next, fault found (1): Open it')
  })

  it('asks for nothing where nothing is missing, or where it is archived', async () => {
    const record = aircraftSheet({ standings: counts({ 'record-only': 4 }) })
    expect((await mountSuspended(AircraftListRow, { props: { item: record } })).text()).not.toContain('Next,')
    const sheet = aircraftSheet()
    const archived = { ...sheet, aircraft: { ...sheet.aircraft, archivedAt: '2026-06-01T00:00:00.000Z' } }
    expect((await mountSuspended(AircraftListRow, { props: { item: archived } })).text()).not.toContain(
      'Next,',
    )
  })
})

describe('Standings', () => {
  it('counts what there is and leaves out what there is not', async () => {
    const { standings, channels } = aircraftSheet()
    const list = await mountSuspended(Standings, { props: { standings, channels } })
    expect(list.get('h2').text()).toBe('Where the 4 channels stand')
    expect(list.findAll('dt')).toHaveLength(2)
  })
})

describe('LayoutPreview', () => {
  it('names the channels, zones and states before anything is stored', async () => {
    const layOut = layOutEngine({
      cylinders: 2,
      cooling: 'air',
      ignition: 'two-magnetos',
      quantities: ['exhaust-gas-temperature'],
    })
    const preview = await mountSuspended(LayoutPreview, { props: { layOut } })
    expect(preview.text()).toContain('EGT 1 · EGT 2')
    expect(preview.text()).toContain('suggestions: common practice, no source')
    expect(preview.attributes('aria-live')).toBe('polite')
  })

  it('waits while the engine is not filled in', async () => {
    const preview = await mountSuspended(LayoutPreview, { props: { layOut: null } })
    expect(preview.text()).toContain('Fill in the engine')
  })
})

describe('SubNavigation', () => {
  it('is a named landmark that leads to every page of the aircraft', async () => {
    const navigation = await mountSuspended(SubNavigation, { props: { aircraft: aircraftSheet().aircraft } })
    expect(navigation.get('nav').attributes('aria-label')).toBe('Pages of Two-seat project')
    const targets = navigation.findAll('nav a').map((link) => link.attributes('href'))
    expect(targets).toContain('/aircraft/7/zones')
    expect(new Set(targets).size).toBe(targets.length)
  })
})
