// Stand-in mail server: takes messages over the wire, keeps them here, shows them on a page, sends nothing on.
import { randomUUID } from 'node:crypto'
import { mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { simpleParser } from 'mailparser'
import { SMTPServer } from 'smtp-server'
import { serve } from './http.mjs'
import { createBehaviour } from './mail-behaviour.mjs'
import { mailRoutes } from './mail-pages.mjs'

const folder = process.env.MAIL_DIR ?? join(import.meta.dirname, '../../.data/mail')
mkdirSync(folder, { recursive: true, mode: 0o700 })

const behaviour = createBehaviour()
const box = {
  messages: [],
  clear() {
    box.messages = []
    for (const name of readdirSync(folder)) if (/\.(eml|json)$/.test(name)) rmSync(join(folder, name))
  },
}

/** Messages of earlier runs come back, oldest first: a link sent yesterday can still be followed. */
async function recall() {
  for (const name of readdirSync(folder).filter(file => file.endsWith('.json')).sort()) {
    const envelope = JSON.parse(readFileSync(join(folder, name), 'utf8'))
    box.messages.push({ ...envelope, parsed: await simpleParser(readFileSync(join(folder, name.replace(/json$/, 'eml')))) })
  }
}

async function keep(raw, session) {
  const envelope = { id: randomUUID(), receivedAt: new Date().toISOString(), from: session.envelope.mailFrom?.address ?? '', to: session.envelope.rcptTo.map(({ address }) => address.toLowerCase()) }
  const name = join(folder, `${envelope.receivedAt.replaceAll(':', '')}-${envelope.id}`)
  writeFileSync(`${name}.eml`, raw)
  writeFileSync(`${name}.json`, JSON.stringify(envelope))
  box.messages.push({ ...envelope, parsed: await simpleParser(raw) })
}

const answer = (code, words) => Object.assign(new Error(words), { responseCode: code })

/** The end of a message's data: what the scripted behaviour says happens now. */
async function finish(raw, session, done) {
  const mode = behaviour.take(session.envelope.rcptTo.map(({ address }) => address))
  if (mode === 'reject-4xx') return done(answer(451, 'Try again later'))
  if (mode === 'reject-5xx') return done(answer(550, 'No such mailbox here'))
  if (mode === 'hang') return
  await keep(raw, session)
  // Taken, but the sender never hears so: the connection goes before the reply.
  if (mode === 'drop-after-data') return sockets.get(session.remotePort)?.destroy()
  done(null, 'Kept')
}

/** Open connections by the sender's port, so that one can be cut. */
const sockets = new Map()

const server = new SMTPServer({
  authOptional: true,
  disabledCommands: ['STARTTLS', 'AUTH'],
  disableReverseLookup: true,
  closeTimeout: 200,
  socketTimeout: 10 * 60_000,
  onData(stream, session, done) {
    const chunks = []
    stream.on('data', chunk => chunks.push(chunk))
    stream.on('end', () => finish(Buffer.concat(chunks), session, done).catch(done))
  },
})
server.on('error', error => console.error(error.message))
server.server.on('connection', (socket) => {
  const { remotePort } = socket
  sockets.set(remotePort, socket)
  socket.once('close', () => sockets.delete(remotePort))
})

await recall()
server.listen(Number(process.env.MAIL_PORT ?? 3025), '127.0.0.1')
serve(Number(process.env.MAIL_PAGE_PORT ?? 3026), mailRoutes(box, behaviour))
