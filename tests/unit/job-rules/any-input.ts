import fc from 'fast-check'

/** The parts of JSON Schema that input schemas use. */
interface InputSchema {
  type?: string
  enum?: unknown[]
  const?: unknown
  anyOf?: InputSchema[]
  oneOf?: InputSchema[]
  allOf?: InputSchema[]
  properties?: Record<string, InputSchema>
  required?: string[]
  items?: InputSchema
  prefixItems?: InputSchema[]
  minItems?: number
  maxItems?: number
  minimum?: number
  maximum?: number
}

const TRADE_NUMBERS = [0, 0.03, 0.1, 0.35, 0.4, 0.8, 1, 1.5, 2.5, 4, 6, 10, 16, 25, 30, 32, 40, 60, 80, 100, 115, 230, 500, 1800]
const TRADE_TEXTS = ['16:00', '07:00', '24:00', '2026-01-15T00:00', '2026-12-01', '2028-02-29', 'BS 7671:2018+A4:2026', '1312345678907', '81234567890', 'Wtr_Wd', 'x', '']
const GARBAGE = [null, Number.NaN, Number.POSITIVE_INFINITY, -1, -0, 1e308, 5e-324, 'x', '', true, [], {}, [Number.NaN], '2026-02-30']

/** Inputs of the shape a schema describes, most of them plausible, some of them with one thing wrong in them. */
export function anyInput(schema: InputSchema): fc.Arbitrary<unknown> {
  return fc.oneof(
    { weight: 6, arbitrary: valueFor(schema, 0) },
    { weight: 5, arbitrary: valueFor(schema, 0.08) },
    { weight: 1, arbitrary: fc.anything() },
  )
}

function valueFor(schema: InputSchema, wrong: number): fc.Arbitrary<unknown> {
  const plausible = plausibleFor(schema, wrong)
  if (wrong === 0) return plausible
  return fc.oneof({ weight: Math.round(100 * (1 - wrong)), arbitrary: plausible }, { weight: Math.round(100 * wrong), arbitrary: fc.constantFrom(...GARBAGE) })
}

function plausibleFor(schema: InputSchema, wrong: number): fc.Arbitrary<unknown> {
  if (schema.enum) return fc.constantFrom(...schema.enum)
  if ('const' in schema) return fc.constant(schema.const)
  const choices = schema.anyOf ?? schema.oneOf ?? schema.allOf
  if (choices) return fc.oneof(...choices.map(choice => valueFor(choice, wrong)))
  if (schema.type === 'object') return objectFor(schema, wrong)
  if (schema.type === 'array') return arrayFor(schema, wrong)
  if (schema.type === 'number' || schema.type === 'integer') return numberFor(schema)
  if (schema.type === 'string') return fc.oneof(fc.constantFrom(...TRADE_TEXTS), fc.string({ maxLength: 8 }))
  if (schema.type === 'boolean') return fc.boolean()
  if (schema.type === 'null') return fc.constant(null)
  return fc.constantFrom<unknown>(...TRADE_NUMBERS, ...TRADE_TEXTS)
}

function objectFor(schema: InputSchema, wrong: number): fc.Arbitrary<unknown> {
  const fields = Object.entries(schema.properties ?? {}).map(([key, inner]) => {
    const value = valueFor(inner, wrong)
    const isRequired = schema.required?.includes(key)
    return [key, isRequired ? value : fc.oneof({ weight: 4, arbitrary: value }, { weight: 1, arbitrary: fc.constant(undefined) })] as const
  })
  return fc.record(Object.fromEntries(fields)).map(found => Object.fromEntries(Object.entries(found).filter(([, value]) => value !== undefined)))
}

function arrayFor(schema: InputSchema, wrong: number): fc.Arbitrary<unknown> {
  if (schema.prefixItems) return fc.tuple(...schema.prefixItems.map(inner => valueFor(inner, wrong)))
  const minLength = schema.minItems ?? 0
  return fc.array(valueFor(schema.items ?? {}, wrong), { minLength, maxLength: Math.min(schema.maxItems ?? 4, Math.max(minLength, 4)) })
}

function numberFor({ type, minimum = -10, maximum = 100_000 }: InputSchema): fc.Arbitrary<unknown> {
  const fitting = TRADE_NUMBERS.filter(number => number >= minimum && number <= maximum)
  const whole = fc.integer({ min: Math.ceil(Math.max(minimum, -1e6)), max: Math.floor(Math.min(maximum, 1e6)) })
  const anyNumber = type === 'integer' ? whole : fc.double({ min: minimum, max: maximum, noNaN: true })
  return fc.oneof(anyNumber, ...(fitting.length ? [fc.constantFrom(...fitting)] : []))
}
