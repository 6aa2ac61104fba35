import type * as z from 'zod'

/** zod's issues as sentences by field path; the first of each field, without the payload's wrapping `fields.`. */
export function fieldProblems(error: z.ZodError): Record<string, string> {
  const fields: Record<string, string> = {}
  for (const issue of error.issues) {
    const path = issue.path.map(String).join('.').replace(/^fields\./, '') || 'form'
    fields[path] ??= issue.code === 'unrecognized_keys' ? `Not a field of this form: ${issue.keys.join(', ')}` : issue.message
  }
  return fields
}
