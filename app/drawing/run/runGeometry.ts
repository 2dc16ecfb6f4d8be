import type { FigureWords } from '#shared/domain/findings'
import { drawAcross } from './across'
import { drawDown } from './down'
import type { RunGeometry } from './primitives'
import { runModel } from './runModel'
import type { RunView } from './types'

/** One run drawn for a wide and for a narrow sheet. */
export interface RunDrawings {
  across: RunGeometry
  down: RunGeometry
}

/** Draws a run in a chosen state, both ways, from one model of it. */
export function runDrawings(view: RunView, figures: FigureWords): RunDrawings {
  const model = runModel(view, figures)
  return { across: drawAcross(model), down: drawDown(model) }
}
