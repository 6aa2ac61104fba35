/** A reading's figure in the unit that its test is judged in. */
import type { ReadingRow } from '../../types/record'

const FACTORS: Record<string, { of: string, factor: number }> = {
  'Ω': { of: 'Ω', factor: 1 }, 'mΩ': { of: 'Ω', factor: 1e-3 }, 'kΩ': { of: 'Ω', factor: 1e3 }, 'MΩ': { of: 'Ω', factor: 1e6 },
  'A': { of: 'A', factor: 1 }, 'mA': { of: 'A', factor: 1e-3 }, 'kA': { of: 'A', factor: 1e3 },
  's': { of: 's', factor: 1 }, 'ms': { of: 's', factor: 1e-3 },
}

/** The figure, or null where there is none or the units do not go together. The same unit is never touched by arithmetic. */
export function valueIn(reading: ReadingRow | null, unit: string): number | null {
  if (!reading || reading.value === null || (reading.kind !== 'value' && reading.kind !== 'over-range')) return null
  if (reading.unit === unit || reading.unit === '') return reading.value
  const from = FACTORS[reading.unit]
  const to = FACTORS[unit]
  return from && to && from.of === to.of ? reading.value * from.factor / to.factor : null
}
