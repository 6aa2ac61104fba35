import { FIELD_KINDS, type PrintedField } from './field'

export interface FoundField { path: (string | number)[], field: PrintedField }

/** Every printed field anywhere in a record, with its path; earlier readings of a field are not listed again. */
export function fieldsOf(part: unknown, path: (string | number)[] = []): FoundField[] {
  if (isField(part)) return [{ path, field: part }]
  if (Array.isArray(part)) return part.flatMap((one, index) => fieldsOf(one, [...path, index]))
  if (part !== null && typeof part === 'object') return Object.entries(part).flatMap(([key, one]) => fieldsOf(one, [...path, key]))
  return []
}

function isField(part: unknown): part is PrintedField {
  return part !== null && typeof part === 'object' && 'shown' in part && 'kind' in part && (FIELD_KINDS as readonly unknown[]).includes(part.kind)
}
