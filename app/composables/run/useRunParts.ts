import { cableOf, cableWords } from '#shared/domain/runDraft'
import { JOINT_WORDS } from '#shared/domain/wording'
import { thermoelementInfo } from '#shared/thermometry'
import { useRunEditorStore } from '~/stores/runEditor'

export interface RunPart {
  /** As drawing and figures know it. */
  id: string
  kind: 'section' | 'joint' | 'terminals' | 'zones'
  title: string
  detail: string
}

/** The parts of the run being edited, tip to terminals, for the list that leads to their fields. */
export function useRunParts() {
  const editor = useRunEditorStore()
  const zoneName = (key: string) => editor.surroundings?.zones.find((zone) => zone.key === key)?.name ?? key
  const symbol = (id: Parameters<typeof thermoelementInfo>[0]) => thermoelementInfo(id).symbol

  return computed<RunPart[]>(() => {
    const { parts, surroundings } = editor
    if (!parts || !surroundings) return []
    const list: RunPart[] = parts.sections.flatMap((section, index) => {
      const cable = cableOf(section.positive, section.negative)
      const pair =
        cable === 'other' ? `${symbol(section.positive)} / ${symbol(section.negative)}` : cableWords(cable)
      const part: RunPart = {
        id: `section:${section.id}`,
        kind: 'section',
        title: section.label,
        detail: pair,
      }
      const joint = parts.joints[index]
      if (!joint) return [part]
      const where =
        joint.tipSideZone === joint.displaySideZone
          ? zoneName(joint.tipSideZone)
          : `${zoneName(joint.tipSideZone)} to ${zoneName(joint.displaySideZone)}`
      const crossed = joint.crossed ? ', legs crossed' : ''
      const kind = joint.label === JOINT_WORDS[joint.kind] ? '' : `${JOINT_WORDS[joint.kind]}, `
      return [
        part,
        { id: `joint:${joint.id}`, kind: 'joint', title: joint.label, detail: `${kind}${where}${crossed}` },
      ]
    })
    const crossed = parts.terminals.crossed ? ', legs crossed' : ''
    return [
      ...list,
      {
        id: 'terminals',
        kind: 'terminals',
        title: `Terminals of ${surroundings.displayName}`,
        detail: `${zoneName(surroundings.terminalZone)}${crossed}`,
      },
      {
        id: 'zones',
        kind: 'zones',
        title: 'Zone temperatures',
        detail: 'in the operating state chosen above',
      },
    ]
  })
}
