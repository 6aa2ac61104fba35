/**
 * How one field of a job's record is described. The description is the one truth for its words, unit, range and
 * choices: the zod schema, the field on the page, the row on paper and the list of what is missing all come from it.
 */
import * as z from 'zod'

export type HowKnown = 'read' | 'told' | 'measured' | 'assumed'

export interface Field {
  label: string
  kind: 'choice' | 'figure' | 'text' | 'long-text' | 'date' | 'choices'
  options?: readonly { value: string, label: string }[]
  /** Offered sizes of a figure; the field still takes only these. */
  sizes?: readonly number[]
  unit?: string
  min?: number
  max?: number
  whole?: boolean
  maxLength?: number
  hint?: string
  /** Offers how the value is known; kept beside it as `<key>_how`. */
  how?: readonly HowKnown[]
}

export type Fields = Record<string, Field>
export type FieldValue = string | number | string[] | null

export const HOW_WORDS: Record<HowKnown, string> = { read: 'Read on it', told: 'Told by the network operator', measured: 'Measured', assumed: 'Assumed' }

export const choice = (label: string, options: Record<string, string>, rest: Partial<Field> = {}): Field =>
  ({ label, kind: 'choice', options: Object.entries(options).map(([value, words]) => ({ value, label: words })), ...rest })
export const figure = (label: string, unit: string, min: number, max: number, rest: Partial<Field> = {}): Field =>
  ({ label, kind: 'figure', unit, min, max, ...rest })
export const text = (label: string, rest: Partial<Field> = {}): Field => ({ label, kind: 'text', maxLength: 200, ...rest })
export const longText = (label: string, rest: Partial<Field> = {}): Field => ({ label, kind: 'long-text', maxLength: 4000, ...rest })
export const date = (label: string, rest: Partial<Field> = {}): Field => ({ label, kind: 'date', ...rest })
export const yesNo = (label: string, rest: Partial<Field> = {}): Field => choice(label, { yes: 'Yes', no: 'No' }, rest)
export const yesNoUnseen = (label: string, rest: Partial<Field> = {}): Field => choice(label, { 'yes': 'Yes', 'no': 'No', 'cannot-see': 'Cannot see' }, rest)

/** What one field may hold; the message is an instruction, so that form and server say the same. */
export function fieldSchema(field: Field): z.ZodType<FieldValue> {
  const named = field.label.toLowerCase().replace(/^(mpan|rcd)/, word => word.toUpperCase())
  switch (field.kind) {
    case 'choice': return z.enum(field.options!.map(o => o.value) as [string, ...string[]], `Choose ${named}: ${field.options!.map(o => o.label).join(', ')}`)
    case 'choices': return z.array(z.enum(field.options!.map(o => o.value) as [string, ...string[]])).max(field.options!.length)
    case 'date': return z.iso.date('Enter the day as year, month and day')
    case 'figure': {
      const range = `Enter ${named} as a figure from ${field.min} to ${field.max}${field.unit ? ` ${field.unit}` : ''}`
      if (field.sizes) return z.number(range).refine(n => field.sizes!.includes(n), `Choose one of ${field.sizes.join(', ')}${field.unit ? ` ${field.unit}` : ''}`)
      const number = z.number(range).min(field.min!, range).max(field.max!, range)
      return field.whole ? number.int(`Enter ${named} as a whole number`) : number
    }
    case 'text':
    case 'long-text': return z.string().max(field.maxLength!, `Use at most ${field.maxLength} characters`)
    default: return field.kind satisfies never
  }
}

/** The schema of a change to some of the fields: each may be left out, or null to empty it; nothing else is let in. */
export function changeSchema(fields: Fields): z.ZodType<Record<string, FieldValue>> {
  const shape: Record<string, z.ZodType> = {}
  for (const [key, field] of Object.entries(fields)) {
    shape[key] = fieldSchema(field).nullable().optional()
    if (field.how) shape[`${key}_how`] = z.enum(field.how as [string, ...string[]]).nullable().optional()
  }
  return z.strictObject(shape) as unknown as z.ZodType<Record<string, FieldValue>>
}
