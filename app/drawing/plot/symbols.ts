import { textWidth } from '../text'
import type { Box, Point } from '../run/primitives'
import type { PlotText } from './types'

interface Curve {
  text: string
  /** On which side of the curve its symbol stands. */
  above: boolean
  points: readonly Point[]
}

/** A stretch shorter than this on paper has no room for its symbol. */
const LEAST_LENGTH = 44

function lengthOf(points: readonly Point[]): number {
  const [first, last] = [points[0], points.at(-1)]
  return first && last ? Math.hypot(last.x - first.x, last.y - first.y) : 0
}

function boxOf({ text, x, y, anchor }: PlotText): Box {
  const width = textWidth(text, 12)
  return { x: anchor === 'end' ? x - width : x, y: y - 12, width, height: 16 }
}

/** True where two boxes share ground. */
export function overlap(a: Box, b: Box): boolean {
  return a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height
}

/** Writes the symbol of each alloy beside its stretch, longest first, wherever no other symbol stands. */
export function placeSymbols(curves: readonly Curve[]): PlotText[] {
  const placed: PlotText[] = []
  const byLength = [...curves].sort((a, b) => lengthOf(b.points) - lengthOf(a.points))
  for (const { text, above, points } of byLength) {
    const middle = points[Math.floor(points.length / 2)]
    if (!middle || lengthOf(points) < LEAST_LENGTH) continue
    const candidate: PlotText = above
      ? { text, x: middle.x - 6, y: middle.y - 8, anchor: 'end' }
      : { text, x: middle.x + 8, y: middle.y + 18, anchor: 'start' }
    if (placed.every((other) => !overlap(boxOf(candidate), boxOf(other)))) placed.push(candidate)
  }
  return placed
}
