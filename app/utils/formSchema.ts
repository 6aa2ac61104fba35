import type { TypedSchema, TypedSchemaError } from 'vee-validate'
import type * as z from 'zod'

/** "legs[0].length_m" for ['legs', 0, 'length_m']: the way vee-validate names a field. */
function fieldPath(path: readonly PropertyKey[]): string {
  return path.reduce<string>((text, key) => typeof key === 'number' ? `${text}[${key}]` : text ? `${text}.${String(key)}` : String(key), '')
}

/** Union branches carry their own issues; the first branch that got furthest speaks for the union. */
function flatten(issues: readonly z.core.$ZodIssue[], under: readonly PropertyKey[] = []): { path: string, message: string }[] {
  return issues.flatMap((issue) => {
    const path = [...under, ...issue.path]
    const inner = issue.code === 'invalid_union' ? issue.errors.find(branch => branch.length && branch.every(each => each.path.length)) : undefined
    return inner ? flatten(inner, path) : [{ path: fieldPath(path), message: issue.message }]
  })
}

/**
 * A zod 4 schema as the typed schema vee-validate 4 asks for (the published adapter wants zod 3).
 * Sentences per field come from the schema itself; starting values are left as given, for a draft is never bent to fit.
 */
export function formSchema<Schema extends z.ZodType<Record<string, unknown>, Record<string, unknown>>>(schema: Schema): TypedSchema<z.input<Schema>, z.output<Schema>> {
  return {
    __type: 'VVTypedSchema',
    async parse(values) {
      const result = await schema.safeParseAsync(values)
      if (result.success) return { value: result.data, errors: [] }
      const errors: TypedSchemaError[] = []
      for (const { path, message } of flatten(result.error.issues)) {
        const known = errors.find(error => error.path === path)
        if (known) known.errors.push(message)
        else errors.push({ path, errors: [message] })
      }
      return { errors }
    },
    cast: values => values as z.input<Schema>,
  }
}
