/**
 * Money is whole pence, rates are basis points, and no float ever holds pounds.
 * The one rounding rule of the product: to the nearest penny, a half away from zero; a grant claim alone is rounded down.
 */
import { pence, type Pence } from './units'

/**
 * @example 123450 -> '£1,234.50'; -5 -> '−£0.05' (true minus)
 */
export function formatPounds(amount: Pence | number): string {
  const whole = Math.abs(Math.round(amount))
  const pounds = String(Math.floor(whole / 100)).replace(/\B(?=(\d{3})+$)/g, ',')
  const sign = amount < 0 && whole > 0 ? '\u2212' : ''
  return `${sign}£${pounds}.${String(whole % 100).padStart(2, '0')}`
}

/**
 * A part of an amount, `amount × numerator ÷ denominator`, in whole pence. Exact: worked in whole numbers throughout.
 * @param rounding 'half-away' to the nearest penny, a half away from zero; 'down' towards zero
 */
export function shareOf(amount: Pence | number, numerator: number, denominator: number, rounding: 'half-away' | 'down' = 'half-away'): Pence {
  const product = BigInt(amount) * BigInt(numerator)
  const below = BigInt(denominator)
  const magnitude = product < 0n ? -product : product
  const rounded = rounding === 'down' ? magnitude / below : (2n * magnitude + below) / (2n * below)
  return pence(Number(product < 0n ? -rounded : rounded))
}

const BASIS_POINTS = 10_000

/**
 * VAT on a net amount, to the nearest penny, a half away from zero.
 * @param rate_bp the rate in basis points: 2000 is 20 %
 * @example 90000 at 2000 -> 18000
 */
export function vatOn(net: Pence | number, rate_bp: number): Pence {
  return shareOf(net, rate_bp, BASIS_POINTS)
}

/**
 * Splits an amount by weights and hands out every penny. Each part is first rounded down; the odd pennies then go one
 * each to the parts that lost most by it, the earlier part first where two lost alike. Weights that are all zero count as equal.
 * @example 100 by [1, 1, 1] -> [34, 33, 33]
 */
export function splitPence(total: Pence | number, weights: readonly number[]): Pence[] {
  if (!weights.length) return []
  const usable = weights.some(weight => weight > 0) ? weights : weights.map(() => 1)
  const whole = BigInt(usable.reduce((sum, weight) => sum + weight, 0))
  const magnitude = BigInt(Math.abs(total))
  const parts = usable.map((weight, at) => {
    const product = magnitude * BigInt(weight)
    return { at, amount: product / whole, lost: product % whole }
  })
  const odd = magnitude - parts.reduce((sum, part) => sum + part.amount, 0n)
  const byLoss = [...parts].sort((a, b) => (a.lost === b.lost ? a.at - b.at : a.lost > b.lost ? -1 : 1))
  const lucky = new Set(byLoss.slice(0, Number(odd)).map(part => part.at))
  const sign = total < 0 ? -1 : 1
  return parts.map(part => pence(sign * (Number(part.amount) + (lucky.has(part.at) ? 1 : 0)) || 0))
}
