import { toTypedSchema } from '@vee-validate/zod'
import { useForm } from 'vee-validate'
import type { z } from 'zod'
import type { Problem } from '#shared/types/problem'
import { problemOf } from '~/composables/api/useApi'

export interface FormError {
  /** Dotted path of the field; empty for the form as a whole. */
  field: string
  reason: string
}

/** Where the form's fields carry their ids: `field-` and the dotted path. */
export function fieldId(field: string): string {
  return `field-${field.replaceAll('.', '-')}`
}

/**
 * A form over one of the shared schemas: validated on submit, then on change; a second submit while one is under
 * way does nothing; what the server refuses is shown at its field, and everything typed stays.
 */
export function useZodForm<Schema extends z.ZodTypeAny>(
  schema: Schema,
  initialValues: Record<string, unknown>,
  send: (values: z.output<Schema>) => Promise<void>,
) {
  const form = useForm<Record<string, unknown>>({
    validationSchema: toTypedSchema(schema),
    initialValues,
    keepValuesOnUnmount: true,
  })
  const problem = shallowRef<Problem | null>(null)
  const attempts = ref(0)

  function field<Value = string>(name: string): Ref<Value> {
    const [model] = form.defineField(name, () => ({ validateOnModelUpdate: form.submitCount.value > 0 }))
    return model as Ref<Value>
  }

  const checked = form.handleSubmit(
    async (values) => {
      try {
        await send(values as z.output<Schema>)
      } catch (error) {
        refuse(problemOf(error))
      }
    },
    () => {
      attempts.value++
    },
  )

  function refuse(refusal: Problem): void {
    problem.value = refusal
    for (const { field: name, reason } of refusal.errors ?? []) form.setFieldError(name, reason)
    attempts.value++
  }

  async function submit(event?: Event): Promise<void> {
    event?.preventDefault()
    if (form.isSubmitting.value) return
    problem.value = null
    await checked(event)
  }

  const errors = computed<FormError[]>(() => {
    const fields = Object.entries(form.errors.value).flatMap(([name, reason]) =>
      reason === undefined ? [] : [{ field: name, reason }],
    )
    const whole =
      problem.value && !problem.value.errors?.length ? [{ field: '', reason: problem.value.detail }] : []
    return [...whole, ...fields]
  })

  const errorOf = (name: string): string | undefined => form.errors.value[name]

  return {
    field,
    submit,
    errors,
    errorOf,
    problem,
    /** Counts refused attempts: the error summary takes focus when it rises. */
    attempts,
    /** Starts over with these values and no errors. */
    resetForm: (values: Record<string, unknown>) => form.resetForm({ values }),
    submitting: form.isSubmitting,
    values: form.values,
    setValues: form.setValues,
  }
}
