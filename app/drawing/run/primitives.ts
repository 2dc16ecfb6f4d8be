import type { JointKind } from '#shared/thermometry'
import { textWidth } from '../text'
import type { LineStyle } from './lineStyles'
import type { HeatStep } from './types'

/** Drawing units are CSS pixels at full size. */
export interface Point {
  x: number
  y: number
}

export interface Box extends Point {
  width: number
  height: number
}

export type Tone = 'ink' | 'trouble'

/** Lines of text; `x`, `y` stand at the baseline of the first. */
export interface Label extends Point {
  lines: readonly string[]
  size: number
  lineHeight: number
  anchor: 'start' | 'middle' | 'end'
  tone: Tone
  strong: boolean
  box: Box
}

interface OfPart {
  partId: string
}

export interface Primitives {
  bands: { key: string; heat: HeatStep; box: Box }[]
  /** Where one zone ends and the next begins. */
  dividers: { from: Point; to: Point }[]
  /** How far a section reaches, as a dimension under the drawing. */
  dimensions: { from: Point; to: Point }[]
  wires: (OfPart & { path: string; style: LineStyle; wrong: boolean })[]
  /** Conductors exchanging places, the second one drawn over the first. */
  crossings: (OfPart & {
    paths: readonly [string, string]
    styles: readonly [LineStyle, LineStyle]
    swapped: boolean
  })[]
  bodies: (OfPart & { kind: JointKind; box: Box })[]
  rings: (OfPart & Point)[]
  pills: (OfPart & { text: string; wrong: boolean; box: Box })[]
  /** A trouble mark on the contact of a stray junction. */
  marks: (OfPart & Point)[]
  beads: Point[]
  displays: Box[]
  labels: Label[]
  /** What a pointer or the keyboard can reach. */
  areas: (OfPart & { words: string; box: Box })[]
}

export interface RunGeometry extends Primitives {
  orientation: 'across' | 'down'
  width: number
  height: number
}

/** Puts the pieces of a drawing into one. */
export function together(pieces: readonly Partial<Primitives>[]): Primitives {
  return {
    bands: pieces.flatMap((piece) => piece.bands ?? []),
    dividers: pieces.flatMap((piece) => piece.dividers ?? []),
    dimensions: pieces.flatMap((piece) => piece.dimensions ?? []),
    wires: pieces.flatMap((piece) => piece.wires ?? []),
    crossings: pieces.flatMap((piece) => piece.crossings ?? []),
    bodies: pieces.flatMap((piece) => piece.bodies ?? []),
    rings: pieces.flatMap((piece) => piece.rings ?? []),
    pills: pieces.flatMap((piece) => piece.pills ?? []),
    marks: pieces.flatMap((piece) => piece.marks ?? []),
    beads: pieces.flatMap((piece) => piece.beads ?? []),
    displays: pieces.flatMap((piece) => piece.displays ?? []),
    labels: pieces.flatMap((piece) => piece.labels ?? []),
    areas: pieces.flatMap((piece) => piece.areas ?? []),
  }
}

interface LabelOptions {
  size?: number
  anchor?: Label['anchor']
  tone?: Tone
  strong?: boolean
}

/** A label with the box it takes up; nothing where there is nothing to say. */
export function label(
  lines: readonly string[],
  { x, y }: Point,
  { size = 12, anchor = 'start', tone = 'ink', strong = false }: LabelOptions = {},
): Label[] {
  if (lines.length === 0) return []
  const width = Math.max(...lines.map((line) => textWidth(line, size)))
  const lineHeight = Math.round(size * 1.2)
  const left = anchor === 'start' ? x : anchor === 'end' ? x - width : x - width / 2
  const box = { x: left, y: y - size * 0.8, width, height: lineHeight * (lines.length - 1) + size }
  return [{ lines, x, y, size, lineHeight, anchor, tone, strong, box }]
}
