/**
 * Limits are tested on unrounded figures. Binary fractions cannot hold 0.1 exactly, so a sum that is exactly on its
 * limit may come out above it in the sixteenth place; that dust, and nothing larger, is forgiven.
 */
const DUST = 1e-12

export function notAbove(value: number, limit: number): boolean {
  return value <= limit + Math.abs(limit) * DUST
}

export function notBelow(value: number, least: number): boolean {
  return notAbove(least, value)
}
