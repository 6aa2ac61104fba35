/** Guards the arrows: app -> shared <- server, api -> services -> queries and adapters, nothing imports api; no clock or chance in shared. */
import { readdirSync, readFileSync, statSync } from 'node:fs'
import { join, relative } from 'node:path'
import { fileURLToPath } from 'node:url'
import { describe, expect, it } from 'vitest'

const ROOT = fileURLToPath(new URL('../..', import.meta.url))

function filesBelow(folder: string): string[] {
  return readdirSync(join(ROOT, folder)).flatMap((name) => {
    const path = join(folder, name)
    return statSync(join(ROOT, path)).isDirectory() ? filesBelow(path) : /\.(ts|vue)$/.test(name) ? [path] : []
  })
}

const source = (path: string) => readFileSync(join(ROOT, path), 'utf8')
const IMPORT = /(?:import|export)\s[^'"]*?from\s*['"]([^'"]+)['"]|import\(\s*['"]([^'"]+)['"]\s*\)|import\s+['"]([^'"]+)['"]/g
const importsOf = (path: string) => [...source(path).matchAll(IMPORT)].map(match => (match[1] ?? match[2] ?? match[3])!)

/** Where an import leads, as a path from the root, or the package's name. */
function target(from: string, wanted: string): string {
  if (wanted.startsWith('#shared/')) return `shared/${wanted.slice(8)}`
  if (wanted.startsWith('#server/')) return `server/${wanted.slice(8)}`
  if (wanted.startsWith('~/')) return `app/${wanted.slice(2)}`
  if (wanted.startsWith('.')) return relative(ROOT, join(ROOT, from, '..', wanted))
  return wanted
}

const arrows = (folder: string) => filesBelow(folder).flatMap(from => importsOf(from).map(wanted => ({ from, to: target(from, wanted) })))
const wrong = (folder: string, isWrong: (to: string, from: string) => boolean) => arrows(folder).filter(({ from, to }) => isWrong(to, from)).map(({ from, to }) => `${from} -> ${to}`)

/** What shared/ may use from outside. */
const SHARED_MAY = ['zod', 'canonicalize', '@date-fns/tz']

describe('the arrows', () => {
  it('sees the imports at all', () => {
    expect(arrows('shared').length).toBeGreaterThan(100)
    expect(arrows('server').length).toBeGreaterThan(100)
  })
  it('lets shared import only shared and a short list', () => {
    expect(wrong('shared', to => !to.startsWith('shared/') && !SHARED_MAY.includes(to) && to !== '#auth-utils')).toEqual([])
  })
  it('keeps imports inside shared relative, so that the calc command needs no alias', () => {
    expect(filesBelow('shared').filter(path => importsOf(path).some(wanted => wanted.startsWith('#shared')))).toEqual([])
  })
  it('lets app import no server', () => {
    expect(wrong('app', to => to.startsWith('server/') || to === 'pg' || to.startsWith('drizzle-orm') || to.startsWith('node:'))).toEqual([])
  })
  it('lets server import no app', () => {
    expect(wrong('server', to => to.startsWith('app/'))).toEqual([])
  })
  it('lets nothing import the handlers', () => {
    expect([...wrong('server', to => to.startsWith('server/api/')), ...wrong('app', to => to.startsWith('server/api/'))]).toEqual([])
  })
  it('keeps services and queries free of the handlers\' framework', () => {
    expect(wrong('server/services', to => to === 'h3' || to === '#imports')).toEqual([])
    expect(wrong('server/db', to => to === 'h3' || to === '#imports' || to.startsWith('server/services/'))).toEqual([])
  })
  it('keeps outside packages in adapters', () => {
    expect(wrong('server', (to, from) => ['nodemailer', 'stripe', 'pdfmake'].includes(to) && !from.startsWith('server/adapters/'))).toEqual([])
  })
  it('makes papers and messages from data alone', () => {
    expect([...wrong('server/documents', to => to.startsWith('server/db') || to.startsWith('server/adapters')), ...wrong('server/messages', to => to.startsWith('server/db') || to.startsWith('server/adapters'))]).toEqual([])
  })
})

describe('shared', () => {
  it('reads no clock, no chance and no process', () => {
    const bare = (path: string) => source(path).replace(/\/\*[\s\S]*?\*\/|\/\/.*$/gm, '')
    expect(filesBelow('shared').filter(path => /\bprocess\.|Date\.now\(\)|new Date\(\)|Math\.random\(/.test(bare(path)))).toEqual([])
  })
})

describe('handlers', () => {
  it('hold no try and no raw SQL', () => {
    expect(filesBelow('server/api').filter(path => /\btry\s*\{|\bsql`/.test(source(path)))).toEqual([])
  })
  it('are made by one of the three makers', () => {
    const made = /export default define(Firm|Job|Open|Customer\w*)Handler\b/
    expect(filesBelow('server/api').filter(path => !made.test(source(path)))).toEqual([])
  })
})
