import { Mendable } from '../../lib/say.mjs'

/** What the command line asks for. @throws Mendable for what nobody knows */
export function readWishes(args, known) {
  const only = args.find(arg => arg.startsWith('--only='))?.slice('--only='.length).split(',').filter(Boolean)
  const strange = [...args.filter(arg => !/^--(only=.*|million|fresh)$/.test(arg)), ...(only ?? []).filter(id => !known.includes(id))]
  if (strange.length > 0) throw new Mendable(`"${strange.join(', ')}" is not known here`, `use --only= with any of ${known.join(', ')}; --million; --fresh`)
  return { wants: id => !only || only.includes(id), million: args.includes('--million'), fresh: args.includes('--fresh') }
}
