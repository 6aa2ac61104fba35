import { note } from './note.mjs'
import { mean, spread } from './statistics.mjs'

/** One round asks anchor, ours, ours, anchor, so that a machine growing busier weighs on both alike. */
async function round(anchor, ours) {
  const first = await anchor()
  const [one, two] = [await ours(), await ours()]
  return { anchor: [first, await anchor()], ours: [one, two] }
}

async function run(anchor, ours, rounds) {
  const all = []
  for (let count = 0; count < rounds; count++) all.push(await round(anchor, ours))
  return all
}

/** Each round's ratio of what `pick` takes out of its measurements. */
export const ratiosOf = (rounds, pick) => rounds.map(each => mean(each.ours.map(pick)) / mean(each.anchor.map(pick)))

/** Seven rounds; where they spread too far, once more, and the calmer run counts, never the better one. */
export async function abba({ anchor, ours, pick, rounds = 7 }) {
  const first = await run(anchor, ours, rounds)
  if (spread(ratiosOf(first, pick)) <= 0.25) return first
  note('noisy: measuring once more')
  const second = await run(anchor, ours, rounds)
  return spread(ratiosOf(second, pick)) < spread(ratiosOf(first, pick)) ? second : first
}
