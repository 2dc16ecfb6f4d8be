import type { MaybeRefOrGetter } from 'vue'
import { runDrawings } from '~/drawing/run/runGeometry'
import { runModel } from '~/drawing/run/runModel'
import type { RunView } from '~/drawing/run/types'
import { useFigureWords } from '~/composables/drawing/useFigureWords'

/** A run drawn for wide and narrow sheets and told in words, in the person's units. */
export function useRunDrawing(view: MaybeRefOrGetter<RunView>) {
  const figures = useFigureWords()
  const drawings = computed(() => runDrawings(toValue(view), figures.value))
  const parts = computed(() => runModel(toValue(view), figures.value).parts)
  return { drawings, parts }
}
