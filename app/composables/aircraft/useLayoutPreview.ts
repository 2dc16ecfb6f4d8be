import type { EngineLayOut } from '#shared/domain/engineLayout'
import { EngineLayoutError, layOutEngine } from '#shared/domain/engineLayout'
import { engineLayoutSchema } from '#shared/schemas/aircraft'

/** What an engine layout, finished or not, would lay out. Null while it cannot be laid out. */
export function useLayoutPreview(layout: () => unknown) {
  return computed<EngineLayOut | null>(() => {
    const parsed = engineLayoutSchema.safeParse(layout())
    if (!parsed.success) return null
    try {
      return layOutEngine(parsed.data)
    } catch (error) {
      if (error instanceof EngineLayoutError) return null
      throw error
    }
  })
}
