/**
 * `npm run bench`: what the product costs, each figure as a ratio to an anchor measured in the same run.
 * One JSON line a figure on stdout, progress on stderr, and a last line that says what is short of its target.
 * `--only=P-11,P-22` measures those; `--million` adds a firm of a million jobs; `--fresh` makes the data anew.
 */
import { isStopping, stopAll, stopOnSignals, sweepLeftovers } from '../lib/children.mjs'
import { alone } from '../lib/lock.mjs'
import { checkNode } from '../lib/packages.mjs'
import { Mendable, say, sayFailure } from '../lib/say.mjs'
import { FIGURES } from './figures/all.mjs'
import { isShort, shortSentence } from './lib/figure.mjs'
import { note } from './lib/note.mjs'
import { readWishes } from './lib/wishes.mjs'
import { benchWorld } from './lib/world.mjs'

async function measureAll() {
  checkNode()
  await sweepLeftovers()
  const wishes = readWishes(process.argv.slice(2), FIGURES.flatMap(group => group.ids))
  const world = benchWorld(wishes)
  const found = []
  for (const { ids, measure } of FIGURES.filter(group => group.ids.some(wishes.wants))) {
    note(`measuring ${ids.join(', ')}`)
    for (const figure of await measure(world, wishes)) {
      if (!wishes.wants(figure.id)) continue
      found.push(figure)
      say(JSON.stringify(figure))
    }
  }
  if (found.length === 0) throw new Mendable('No figure was measured', 'read the lines above')
  say(shortSentence(found.filter(isShort)))
}

stopOnSignals(() => note('stopping'))
alone('bench', measureAll, { patienceMs: 0 }).catch((error) => {
  if (isStopping()) return
  sayFailure(error)
  process.exitCode = 1
}).finally(async () => {
  if (isStopping()) return
  await stopAll()
  process.exit()
})
