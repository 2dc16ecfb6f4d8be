import type { WiringRunInput } from '../../schemas/run'
import type { ZoneKind } from '../../schemas/zone'
import type { LetterType } from '../../thermometry/its90'
import { legsOf } from '../../thermometry/thermoelements'

export interface DraftZone {
  key: string
  name: string
  kind: ZoneKind
}

/** Length of lead with which a probe is drawn until its own is logged, m. Invented, to be corrected. */
const PROBE_LEAD_METRES = 0.5

/**
 * The usual run to begin with: probe, plug pair in the engine bay, extension of the same type, terminals.
 *
 * @param zones zones of the aircraft; the plug pair goes into the first engine bay, else the first zone
 * @param newId makes ids that are unique within the run
 */
export function defaultRun(
  type: LetterType,
  zones: readonly DraftZone[],
  newId: () => string,
): WiringRunInput {
  const zone = zones.find(({ kind }) => kind === 'engine-bay') ?? zones[0]
  const key = zone?.key ?? ''
  return {
    sections: [
      { id: newId(), label: 'Probe', ...legsOf(type), lengthMetres: PROBE_LEAD_METRES, gaugeAwg: null },
      { id: newId(), label: 'Extension', ...legsOf(type), lengthMetres: null, gaugeAwg: null },
    ],
    joints: [
      {
        id: newId(),
        label: 'Plug pair',
        kind: 'plug-pair',
        tipSideZone: key,
        displaySideZone: key,
        crossed: false,
        positiveMetal: null,
        negativeMetal: null,
        positiveOffsetKelvin: 0,
        negativeOffsetKelvin: 0,
      },
    ],
    terminals: { crossed: false, positiveOffsetKelvin: 0, negativeOffsetKelvin: 0 },
  }
}
