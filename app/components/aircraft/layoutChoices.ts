import type { CreateAircraftInput } from '#shared/schemas/aircraft'

type Layout = CreateAircraftInput['layout']

export const COOLING_CHOICES: { value: Layout['cooling']; text: string }[] = [
  { value: 'air', text: 'Air' },
  { value: 'liquid', text: 'Liquid' },
]

export const IGNITION_CHOICES: { value: Layout['ignition']; text: string }[] = [
  { value: 'two-magnetos', text: 'Two magnetos' },
  { value: 'magneto-and-electronic', text: 'One magneto, one electronic' },
  { value: 'two-electronic', text: 'Two electronic' },
]

export const CABLE_STANDARD_CHOICES: { value: CreateAircraftInput['cableStandard']; text: string }[] = [
  { value: 'astm-e230', text: 'ANSI MC96.1 / ASTM E230 (red is negative)' },
  { value: 'iec-60584-3', text: 'IEC 60584-3 (white is negative)' },
]
