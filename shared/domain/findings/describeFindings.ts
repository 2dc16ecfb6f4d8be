import type { Finding, Place } from '../../thermometry/run'
import { describeFinding } from './describeFinding'
import type { FigureWords } from './figures'
import type { RunNames } from './names'
import type { FindingSeverity } from './types'

/** Findings of one kind at one place, said once. */
export interface FindingGroup {
  titles: readonly string[]
  explanations: readonly string[]
  whatToDo: readonly string[]
  severity: FindingSeverity
  place: Place
}

export interface DescribedFindings {
  /** Faults first, then cautions, then notes; tip to display within each. */
  groups: readonly FindingGroup[]
  /** Every caution that arises, once. */
  cautions: readonly string[]
}

const ORDER: readonly FindingSeverity[] = ['fault', 'caution', 'note']

/** Where a finding is to be looked for first. */
function placeOf(finding: Finding): Place {
  if ('place' in finding) return finding.place
  const first = finding.code === 'legs-swapped' ? finding.places[0] : undefined
  return first ?? { kind: finding.code === 'tip-outside-type-range' ? 'tip' : 'display' }
}

function unique(items: readonly string[]): string[] {
  return [...new Set(items)]
}

/**
 * Describes the findings of a run together: both legs of one place stand under one heading, and what is true of
 * both is said once.
 */
export function describeFindings(
  findings: readonly Finding[],
  names: RunNames,
  figures: FigureWords,
): DescribedFindings {
  const byKey = new Map<string, Finding[]>()
  for (const finding of findings) {
    const key = `${finding.code} ${JSON.stringify(placeOf(finding))}`
    byKey.set(key, [...(byKey.get(key) ?? []), finding])
  }
  const groups = [...byKey.values()].map((together) => {
    const words = together.map((finding) => describeFinding(finding, names, figures))
    const severities = words.map(({ severity }) => severity)
    return {
      titles: words.map(({ title }) => title),
      explanations: unique(words.map(({ explanation }) => explanation)),
      whatToDo: unique(words.map((one) => one.whatToDo)),
      severity: ORDER.find((severity) => severities.includes(severity)) ?? 'note',
      place: together.map(placeOf)[0] ?? { kind: 'display' as const },
      cautions: words.flatMap(({ cautions }) => cautions),
    }
  })
  groups.sort((a, b) => ORDER.indexOf(a.severity) - ORDER.indexOf(b.severity))
  return {
    groups: groups.map(({ cautions: _, ...group }) => group),
    cautions: unique(groups.flatMap(({ cautions }) => cautions)),
  }
}
