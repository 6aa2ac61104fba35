import { median } from './statistics.mjs'

const rounded = value => value === null || value === undefined ? null : Number(value.toPrecision(4))

/**
 * One figure as it is printed.
 * @param {{ id: string, what: string, ours: number, anchor: number, ratios?: number[], atMost?: number, atLeast?: number, note?: string }} given
 * `ratios` holds one ratio a round, and their median is the figure; without them it is ours / anchor, exact.
 */
export function figure({ id, what, ours, anchor, ratios, atMost, atLeast, note = '' }) {
  const all = ratios ?? [ours / anchor]
  return {
    id, what,
    ours: rounded(ours), anchor: rounded(anchor), ratio: rounded(median(all)),
    min: rounded(Math.min(...all)), median: rounded(median(all)), max: rounded(Math.max(...all)),
    target: atMost !== undefined ? `at most ${atMost}` : atLeast !== undefined ? `at least ${atLeast}` : null,
    met: atMost !== undefined ? median(all) <= atMost : atLeast !== undefined ? median(all) >= atLeast : null,
    note,
  }
}

/** An exact count that is its own figure: no anchor but the number it must not pass. */
export const count = ({ id, what, ours, atMost, note = '' }) => ({ ...figure({ id, what, ours, anchor: 1, atMost, note }) })

export const isShort = each => each.met === false

export function shortSentence(short) {
  if (short.length === 0) return 'Nothing measured is short of its target.'
  return `Short of target: ${short.map(each => `${each.id} ${each.what}: ${each.ratio}, wanted ${each.target}`).join('; ')}.`
}
