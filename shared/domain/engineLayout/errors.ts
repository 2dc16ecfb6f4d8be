/** An engine that cannot be laid out as asked: a quantity it has no place for. */
export class EngineLayoutError extends Error {
  /** The field of the layout to mend. */
  readonly field: string

  constructor(field: string, message: string) {
    super(message)
    this.name = 'EngineLayoutError'
    this.field = field
  }
}
