import fc from 'fast-check'

interface Schema {
  type?: string
  const?: unknown
  enum?: unknown[]
  anyOf?: Schema[]
  oneOf?: Schema[]
  properties?: Record<string, Schema>
  required?: string[]
  items?: Schema
  minItems?: number
  maxItems?: number
  minimum?: number
  exclusiveMinimum?: number
  maximum?: number
  pattern?: string
}

/** Inputs that a JSON Schema allows: most keys present, sizes and ratings often ones that are made, zero and extremes among the numbers. */
export function arbitraryOf(raw: unknown): fc.Arbitrary<unknown> {
  const schema = raw as Schema
  if ('const' in schema) return fc.constant(schema.const)
  if (schema.enum) return fc.constantFrom(...schema.enum)
  const choice = schema.anyOf ?? schema.oneOf
  if (choice) return fc.oneof(...choice.map(arbitraryOf))
  switch (schema.type) {
    case 'object': {
      const entries = Object.entries(schema.properties ?? {}).map(([key, each]) => [key, arbitraryOf(each)] as const)
      return fc.record(Object.fromEntries(entries), { requiredKeys: entries.map(([key]) => key).filter(key => schema.required?.includes(key)) })
    }
    case 'array': return fc.array(arbitraryOf(schema.items), { minLength: schema.minItems ?? 0, maxLength: schema.minItems ?? 4 })
    case 'boolean': return fc.boolean()
    case 'string': return textOf(schema.pattern)
    default: return numberOf(schema)
  }
}

function textOf(pattern: string | undefined): fc.Arbitrary<string> {
  if (pattern?.includes('T')) return fc.integer({ min: 0, max: 400_000 }).map(half => new Date(half * 1_800_000).toISOString().slice(0, 16))
  if (pattern) return fc.integer({ min: 0, max: 1439 }).map(minute => `${String(Math.floor(minute / 60)).padStart(2, '0')}:${String(minute % 60).padStart(2, '0')}`)
  return fc.constantFrom('BS 7671:2018+A4:2026', 'BS 7671:2018', 'anything')
}

function numberOf({ type, minimum, exclusiveMinimum, maximum }: Schema): fc.Arbitrary<number> {
  const whole = type === 'integer'
  const low = minimum ?? (exclusiveMinimum === undefined ? -100 : Math.max(exclusiveMinimum, Number.MIN_VALUE))
  const high = Math.min(maximum ?? 1e6, 1e6)
  const inside = (value: number) => value >= low && value <= high
  const common = [0, 0.03, 0.4, 1, 1.5, 2.5, 6, 10, 16, 30, 32, 100].filter(inside)
  const spread = whole ? fc.integer({ min: Math.max(1, Math.ceil(low)), max: 30 }) : fc.double({ min: low, max: high, noNaN: true, noDefaultInfinity: true })
  return common.length && !whole ? fc.oneof({ weight: 4, arbitrary: fc.constantFrom(...common) }, { weight: 1, arbitrary: spread }) : spread
}
