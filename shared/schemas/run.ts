import { z } from 'zod'
import { JOINT_KINDS } from '../thermometry/run'
import { THERMOELEMENTS } from '../thermometry/thermoelements'
import { kelvinSchema, lineSchema, versionSchema } from './numbers'

export const MAX_SECTIONS = 16

const partId = z.string().min(1).max(36)
const conductor = z.enum(THERMOELEMENTS, {
  errorMap: () => ({ message: 'Choose a conductor from the list.' }),
})

/** What the run solver needs of a section; see `RunSection`. */
export const runSectionSchema = z
  .object({
    id: partId,
    label: lineSchema('a label for the section', 60),
    positive: conductor,
    negative: conductor,
  })
  .strict()

/** What the run solver needs of a joint; see `RunJoint`. Zones by key. */
export const runJointSchema = z
  .object({
    id: partId,
    label: lineSchema('a label for the joint', 60),
    kind: z.enum(JOINT_KINDS),
    tipSideZone: z.string().min(1, 'Choose a zone.').max(60),
    displaySideZone: z.string().min(1, 'Choose a zone.').max(60),
    crossed: z.boolean(),
    positiveMetal: conductor.nullable(),
    negativeMetal: conductor.nullable(),
    positiveOffsetKelvin: kelvinSchema,
    negativeOffsetKelvin: kelvinSchema,
  })
  .strict()

export const terminalContactsSchema = z
  .object({
    crossed: z.boolean(),
    positiveOffsetKelvin: kelvinSchema,
    negativeOffsetKelvin: kelvinSchema,
  })
  .strict()

/** A section as logged: the solver's part, and what is needed to cut, buy and find it. */
export const loggedSectionSchema = runSectionSchema
  .extend({
    lengthMetres: z
      .number()
      .min(0, 'A length cannot be negative.')
      .max(200, 'Enter at most 200 m.')
      .nullable(),
    gaugeAwg: z.number().int().min(0, 'Enter 0 to 40 AWG.').max(40, 'Enter 0 to 40 AWG.').nullable(),
  })
  .strict()
export type LoggedSection = z.infer<typeof loggedSectionSchema>

interface Parts {
  sections: readonly { id: string }[]
  joints: readonly {
    id: string
    tipSideZone: string
    displaySideZone: string
    positiveMetal: string | null
    negativeMetal: string | null
  }[]
}

/** Rules over a whole run: joints between sections, unique ids, a metal wherever a joint has length. */
export function checkParts(run: Parts, context: z.RefinementCtx): void {
  const refuse = (path: (string | number)[], message: string) =>
    context.addIssue({ code: z.ZodIssueCode.custom, path, message })
  if (run.joints.length !== run.sections.length - 1)
    refuse(['joints'], `A run of ${run.sections.length} sections has ${run.sections.length - 1} joints.`)
  const ids = [...run.sections, ...run.joints].map((part) => part.id)
  if (new Set(ids).size !== ids.length) refuse(['sections'], 'Two parts of the run carry the same id.')
  run.joints.forEach((joint, index) => {
    if (joint.tipSideZone === joint.displaySideZone) return
    if (joint.positiveMetal === null)
      refuse(['joints', index, 'positiveMetal'], 'A joint between two zones needs the metal of its contacts.')
    if (joint.negativeMetal === null)
      refuse(['joints', index, 'negativeMetal'], 'A joint between two zones needs the metal of its contacts.')
  })
}

export const wiringRunSchema = z
  .object({
    sections: z.array(loggedSectionSchema).min(1, 'A run has at least one section.').max(MAX_SECTIONS),
    joints: z.array(runJointSchema).max(MAX_SECTIONS - 1),
    terminals: terminalContactsSchema,
  })
  .strict()
  .superRefine(checkParts)
export type WiringRunInput = z.infer<typeof wiringRunSchema>

/** `version` is null when no run was logged before. Zone keys are zone ids written as text. */
export const saveRunSchema = z.object({ version: versionSchema.nullable(), run: wiringRunSchema }).strict()
export type SaveRunInput = z.infer<typeof saveRunSchema>
