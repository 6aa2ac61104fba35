/** P-1: how much JavaScript a page makes a browser load before it is usable, against a hello-world application. Exact. */
import { randomBytes, createHash, randomUUID } from 'node:crypto'
import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { gzipSync } from 'node:zlib'
import { inRoot } from '../../lib/paths.mjs'
import { count, figure } from '../lib/figure.mjs'
import { helloApp } from '../lib/hello-app.mjs'
import { insideFirm } from '../lib/inside-firm.mjs'
import { requester } from '../lib/requests.mjs'

export const ids = ['P-1']

const kB = bytes => Number((bytes / 1000).toFixed(1))

/** Bytes after `gzip -9` of each script that the page itself names. */
async function scriptBytes(url, path, publicFolder, cookie) {
  const { text } = await requester(url, { accept: 'text/html', ...(cookie && { cookie }) })(path)
  const tags = text.match(/<(?:script|link)\b[^>]*>/g) ?? []
  const wanted = tags.filter(tag => tag.startsWith('<script') || tag.includes('rel="modulepreload"'))
  const names = new Set(wanted.map(tag => /(?:src|href)="(\/_nuxt\/[^"]+\.js)"/.exec(tag)?.[1]).filter(Boolean))
  return [...names].reduce((sum, name) => sum + gzipSync(readFileSync(join(publicFolder, name)), { level: 9 }).length, 0)
}

/** A link to a quote that stands open, made for this run. */
async function makeQuoteLink(owner, firmId) {
  const token = randomBytes(32).toString('base64url')
  await insideFirm(owner, firmId, async () => {
    const { rows: [quote] } = await owner.query('select id, job_id from quote where firm_id = $1 order by (state = \'sent\') desc limit 1', [firmId])
    await owner.query('insert into customer_link (firm_id, id, job_id, purpose, subject_id, token_hash, sent_to) values ($1, $2, $3, \'quote\', $4, $5, \'bench@example.org\')', [firmId, randomUUID(), quote.job_id, quote.id, createHash('sha256').update(token).digest('hex')])
  })
  return token
}

/** Packages that belong on the server: the name of one in a browser's file is one too many. */
const SERVER_ONLY = /pdfmake|drizzle-orm|graphile-worker|nodemailer|api\.stripe\.com/
const filesWithServerParts = folder => readdirSync(folder, { recursive: true, encoding: 'utf8' }).filter(name => name.endsWith('.js') && SERVER_ONLY.test(readFileSync(join(folder, name), 'utf8')))

export async function measure(world) {
  const { baseUrl, owner, firms, signIn } = await world.served()
  const cookie = await signIn(firms.demo)
  const jobId = await insideFirm(owner, firms.demo.id, async () => (await owner.query('select id from job where firm_id = $1 order by (stage = \'on-site\') desc, id limit 1', [firms.demo.id])).rows[0].id)
  const hello = await helloApp()
  const anchor = await scriptBytes(hello.url, '/', hello.publicFolder)
  const pages = [
    ['the job list', '/jobs', cookie, 1.5],
    ['the test sheet', `/jobs/${jobId}/dead`, cookie, 1.8],
    ['the customer\'s quote', `/c/quote/${await makeQuoteLink(owner, firms.demo.id)}`, null, 1.15],
    ['the check page', '/check', null, 1.15],
    ['sign-in', '/sign-in', null, 1.1],
  ]
  const figures = []
  for (const [name, path, who, atMost] of pages) {
    const ours = await scriptBytes(baseUrl, path, inRoot('.output/public'), who)
    figures.push(figure({ id: 'P-1', what: `JavaScript on first load of ${name}, kB after gzip -9`, ours: kB(ours), anchor: kB(anchor), atMost, note: 'exact; anchor: a hello-world application with pages, same packages' }))
  }
  const astray = filesWithServerParts(inRoot('.output/public'))
  return [...figures, count({ id: 'P-1', what: 'Browser files that hold a part of the server', ours: astray.length, atMost: 0, note: astray.join(', ') })]
}
