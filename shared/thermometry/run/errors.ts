import { ThermometryError } from '../errors'

/** The run itself cannot be solved: parts missing, or a zone without a temperature. */
export class RunInputError extends ThermometryError {
  /** Where in the run, dotted, e.g. `joints.1.tipSideZone`. */
  readonly field: string

  constructor(field: string, message: string) {
    super('run-input', message)
    this.name = 'RunInputError'
    this.field = field
  }
}
