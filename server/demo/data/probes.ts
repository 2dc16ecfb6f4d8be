import type { LogProbeInput } from '#shared/schemas/probe'

export type DemoProbe = Omit<LogProbeInput, 'version' | 'thermocoupleType'>

const exhaust = { tipStyle: 'grounded', style: 'clamp', leadLengthMetres: 0.9 } as const
const head = { tipStyle: 'grounded', style: 'gasket-ring', leadLengthMetres: 0.6 } as const

/** What was screwed, clamped and pushed in, by channel. */
export const DEMO_PROBES: Readonly<Record<string, DemoProbe>> = {
  'EGT 1': { ...exhaust, marking: 'E-0101', notes: '50 mm below the flange.' },
  'EGT 2': { ...exhaust, marking: 'E-0102', notes: '50 mm below the flange. Lead chafed and mended.' },
  'EGT 3': { ...exhaust, marking: 'E-0103', notes: '50 mm below the flange.' },
  'EGT 4': { ...exhaust, marking: 'E-0104', notes: '50 mm below the flange.' },
  'CHT 1': { ...head, marking: 'C-0201', notes: 'Under the lower plug.' },
  'CHT 2': { ...head, marking: 'C-0202', notes: 'Under the lower plug.' },
  'CHT 3': { ...head, marking: 'C-0203', notes: 'Under the lower plug.' },
  'CHT 4': { ...head, marking: 'C-0204', notes: 'Under the lower plug.' },
  'OIL T': {
    marking: 'O-0301',
    tipStyle: 'ungrounded',
    style: 'threaded',
    leadLengthMetres: 0.8,
    notes: 'In the filter adapter.',
  },
  'INTAKE AIR': {
    marking: 'A-0401',
    tipStyle: 'exposed',
    style: 'threaded',
    leadLengthMetres: 0.7,
    notes: 'Before the throttle plate.',
  },
  OAT: {
    marking: 'A-0402',
    tipStyle: 'exposed',
    style: 'free-air',
    leadLengthMetres: 1.2,
    notes: 'In the shade of the lower cowl inlet.',
  },
}
