/** A number as shown, with its unit apart so that the unit can be set smaller beside it. */
export interface Figure {
  value: string
  unit: string
}

/** Figure and unit on one line of text, kept together by a no-break space. */
export function figureText({ value, unit }: Figure): string {
  return unit === '' ? value : `${value}\u00a0${unit}`
}
