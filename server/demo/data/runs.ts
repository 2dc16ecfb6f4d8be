import type { LoggedSection, WiringRunInput } from '#shared/schemas/run'

/** Zones by name here; they become ids when the run is logged. */
export type DemoRun = WiringRunInput
type DemoJoint = WiringRunInput['joints'][number]

const BAY = 'Engine bay'
const FIREWALL = 'Firewall, engine side'
const CABIN = 'Cabin'

function section(id: string, label: string, lengthMetres: number, gaugeAwg: number): LoggedSection {
  return { id, label, positive: 'KP', negative: 'KN', lengthMetres, gaugeAwg }
}

const meeting = {
  displaySideZone: BAY,
  crossed: false,
  positiveMetal: null,
  negativeMetal: null,
  positiveOffsetKelvin: 0,
  negativeOffsetKelvin: 0,
} as const

const plug: DemoJoint = {
  ...meeting,
  id: 'plug',
  label: 'Plug pair',
  kind: 'plug-pair',
  tipSideZone: BAY,
  positiveMetal: 'KP',
  negativeMetal: 'KN',
}

const feedThrough: DemoJoint = {
  ...meeting,
  id: 'firewall',
  label: 'Firewall feed-through',
  kind: 'feed-through',
  tipSideZone: FIREWALL,
  displaySideZone: CABIN,
  positiveMetal: 'KP',
  negativeMetal: 'KN',
}

const terminals = { crossed: false, positiveOffsetKelvin: 0, negativeOffsetKelvin: 0 }

interface Lengths {
  probe: number
  engine: number
  cabin: number
}

/** As it should be: type K pair all the way, from the probe through the firewall to the display. */
function rightRun({ probe, engine, cabin }: Lengths): DemoRun {
  return {
    sections: [
      section('probe', 'Probe lead', probe, 20),
      section('engine', 'Extension, engine side', engine, 20),
      section('cabin', 'Extension, cabin side', cabin, 20),
    ],
    joints: [plug, feedThrough],
    terminals,
  }
}

/** Wrong as built: copper wire in both legs from the plug pair to the display. */
function copperExtension(lengths: Lengths): DemoRun {
  const copper = { positive: 'Cu', negative: 'Cu' } as const
  return {
    sections: [
      section('probe', 'Probe lead', lengths.probe, 20),
      { ...section('engine', 'Hook-up wire, engine side', lengths.engine, 22), ...copper },
      { ...section('cabin', 'Hook-up wire, cabin side', lengths.cabin, 22), ...copper },
    ],
    joints: [plug, { ...feedThrough, positiveMetal: 'Cu', negativeMetal: 'Cu' }],
    terminals,
  }
}

/** Wrong as built: the extension is swapped at the plug pair and swapped back at the terminals. */
function swappedAtBothEnds(lengths: Lengths): DemoRun {
  const run = rightRun(lengths)
  return {
    ...run,
    // The pins mate with the probe's, so they are of the metals of the probe's conductors that meet them.
    joints: [{ ...plug, crossed: true, positiveMetal: 'KN', negativeMetal: 'KP' }, feedThrough],
    terminals: { ...terminals, crossed: true },
  }
}

/** Wrong as built: a chafed positive conductor was mended with a length of copper near the firewall. */
function copperSplice({ probe, engine, cabin }: Lengths): DemoRun {
  const splice = { ...meeting, kind: 'splice' } as const
  return {
    sections: [
      section('probe', 'Probe lead', probe, 20),
      section('engine', 'Extension, engine side', engine, 20),
      { ...section('mend', 'Mended length', 0.3, 20), positive: 'Cu' },
      section('tail', 'Extension to the firewall', 0.2, 20),
      section('cabin', 'Extension, cabin side', cabin, 20),
    ],
    joints: [
      plug,
      { ...splice, id: 'mend-hot', label: 'Splice, engine bay', tipSideZone: BAY },
      {
        ...splice,
        id: 'mend-cold',
        label: 'Splice, firewall',
        tipSideZone: FIREWALL,
        displaySideZone: FIREWALL,
      },
      feedThrough,
    ],
    terminals,
  }
}

/** Every thermocouple channel's run as built, by tag. */
export const DEMO_RUNS: Readonly<Record<string, DemoRun>> = {
  'EGT 1': rightRun({ probe: 0.9, engine: 1.1, cabin: 0.8 }),
  'EGT 2': copperSplice({ probe: 0.9, engine: 0.9, cabin: 0.8 }),
  'EGT 3': rightRun({ probe: 0.9, engine: 1.3, cabin: 0.8 }),
  'EGT 4': rightRun({ probe: 0.9, engine: 1.5, cabin: 0.8 }),
  'CHT 1': rightRun({ probe: 0.6, engine: 1.2, cabin: 0.8 }),
  'CHT 2': copperExtension({ probe: 0.6, engine: 1.3, cabin: 0.8 }),
  'CHT 3': swappedAtBothEnds({ probe: 0.6, engine: 1.4, cabin: 0.8 }),
  'CHT 4': rightRun({ probe: 0.6, engine: 1.6, cabin: 0.8 }),
  'OIL T': rightRun({ probe: 0.8, engine: 0.9, cabin: 0.8 }),
  'INTAKE AIR': rightRun({ probe: 0.7, engine: 1.2, cabin: 0.9 }),
  OAT: rightRun({ probe: 1.2, engine: 1.0, cabin: 0.9 }),
}
