/**
 * What does the dwelling draw at once, with the allowances for diversity?
 *
 * Each use by its own rule; the charger, storage heating and fixed loads in full.
 *
 * @source On-Site Guide Table A2, as in tables/demand.data.ts
 * @example cooker 32 A with a socket -> 10 + 0.3 × 22 + 5 = 21.6 A
 */
import * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer, WorkingStep } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { fields, fromZero, U_V, yesNo } from './inputs'
import { tableA2 } from './tables/demand.data'
import { computed, shown, step } from './working'

const current = fromZero('the current')
const currents = (what: string) => z.array(z.number(`Give ${what} as numbers.`).nonnegative(`Give ${what} as numbers not below zero.`), `Give ${what} as a list.`).optional()
const single = <const Use extends string>(use: Use) => fields({ use: z.literal(use), I_A: current })

const item = z.discriminatedUnion('use', [
  single('lighting'), single('heating'), single('thermostatic-water'), single('storage-heating'), single('motor'), single('fixed'), single('ev'),
  fields({ use: z.literal('cooker'), I_A: current, P_W: fromZero('the power in W'), socket: yesNo('whether the control has a socket') }),
  fields({ use: z.literal('instantaneous-water'), I_A: currents('the heaters\' currents') }),
  fields({ use: z.literal('sockets'), In_A: currents('the circuits\' currents') }),
], 'Give each item a use: lighting, heating, cooker, instantaneous-water, thermostatic-water, sockets, storage-heating, motor, fixed or ev.')
const input = fields({ items: z.array(item, 'Give the items as a list.').max(200, 'At most 200 items.').optional(), U_V })

type Item = z.infer<typeof item>
export type DemandInput = z.infer<typeof input>
export interface DemandItem { use: Item['use'], connected_A: number, demand_A: number }
export interface DemandResult { items: DemandItem[], total_A: number }

/** Shares of the allowance table. */
const LIGHTING_SHARE = 0.66
const FIRST_A = 10
const HEATING_REST_SHARE = 0.5
const COOKER_REST_SHARE = 0.3
const COOKER_SOCKET_A = 5
const OTHER_HEATERS_SHARE = 0.25
const OTHER_CIRCUITS_SHARE = 0.4

interface Counted { connected_A: number, demand_A: number, expression: string }

/** Null while the item's figure is missing. */
function count(item: Item, U_V: number): Counted | null {
  switch (item.use) {
    case 'lighting': return item.I_A === undefined ? null : { connected_A: item.I_A, demand_A: LIGHTING_SHARE * item.I_A, expression: `${LIGHTING_SHARE} × ${shown(item.I_A)}` }
    case 'heating': return item.I_A === undefined ? null : overFirst(item.I_A, HEATING_REST_SHARE, 0)
    case 'cooker': {
      const I_A = item.I_A ?? (item.P_W === undefined ? undefined : item.P_W / U_V)
      return I_A === undefined ? null : overFirst(I_A, COOKER_REST_SHARE, item.socket ? COOKER_SOCKET_A : 0)
    }
    case 'instantaneous-water': return item.I_A?.length ? largestInFull(item.I_A, 2, OTHER_HEATERS_SHARE) : null
    case 'sockets': return item.In_A?.length ? largestInFull(item.In_A, 1, OTHER_CIRCUITS_SHARE) : null
    case 'thermostatic-water':
    case 'storage-heating':
    case 'motor':
    case 'fixed':
    case 'ev': return item.I_A === undefined ? null : { connected_A: item.I_A, demand_A: item.I_A, expression: `${shown(item.I_A)}, in full` }
    default: return item satisfies never
  }
}

function overFirst(I_A: number, share: number, extra_A: number): Counted {
  const extra = extra_A ? ` + ${extra_A}` : ''
  if (I_A <= FIRST_A) return { connected_A: I_A, demand_A: I_A + extra_A, expression: `${shown(I_A)}${extra}` }
  return { connected_A: I_A, demand_A: FIRST_A + share * (I_A - FIRST_A) + extra_A, expression: `${FIRST_A} + ${share} × (${shown(I_A)} − ${FIRST_A})${extra}` }
}

function largestInFull(list: readonly number[], full: number, share: number): Counted {
  const sorted = [...list].sort((a, b) => b - a)
  const parts = sorted.map((I_A, index) => index < full ? shown(I_A) : `${share} × ${shown(I_A)}`)
  return {
    connected_A: sorted.reduce((sum, I_A) => sum + I_A, 0),
    demand_A: sorted.reduce((sum, I_A, index) => sum + (index < full ? I_A : share * I_A), 0),
    expression: parts.join(' + '),
  }
}

export function demand({ items, U_V = 230 }: DemandInput): Answer<DemandResult> {
  if (!items?.length) return waiting(['items'])
  const counted = items.map(each => count(each, U_V))
  const missing = items.flatMap((each, index) => counted[index] ? [] : [`items.${index}.${each.use === 'sockets' ? 'In_A' : 'I_A'}`])
  if (missing.length) return waiting(missing)
  const known = counted as Counted[]
  const results = known.map(({ connected_A, demand_A }, index): DemandItem => ({ use: items[index]!.use, connected_A, demand_A }))
  const total_A = results.reduce((sum, each) => sum + each.demand_A, 0)
  return answer({
    result: { items: results, total_A },
    working: [...known.flatMap((each, index) => showItem(each, items[index]!, U_V)), computed('total', results.map(each => shown(each.demand_A)).join(' + '), total_A, 'A')],
    notes: repeatNotes(items),
  })
}

function showItem(counted: Counted, item: Item, U_V: number): WorkingStep[] {
  const power = item.use === 'cooker' && item.I_A === undefined ? [computed('cooker', `${shown(item.P_W!)} ÷ ${shown(U_V)}`, counted.connected_A, 'A')] : []
  return [...power, step(item.use, counted.expression, counted.demand_A, 'A', 'On-Site Guide Table A2', tableA2.confidence)]
}

/** Rules that take "the largest" or "the first 10 A" do so once for the dwelling; two items of one use are then counted too high. */
function repeatNotes(items: readonly Item[]): string[] {
  const onceOnly = ['sockets', 'heating', 'cooker', 'instantaneous-water'] as const
  return onceOnly.filter(use => items.filter(each => each.use === use).length > 1)
    .map(use => `There is more than one item of ${use}: each takes the allowance by itself, which counts on the safe side.`)
}

export const demandCalculation = defineCalculation({ name: 'demand', purpose: 'A dwelling\'s maximum demand, with the allowances for diversity.', input, run: demand })
