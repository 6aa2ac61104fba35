import { Agent, request } from 'node:http'
import { Mendable } from '../../lib/say.mjs'

/** A browser's worth of requests to one server: connections stay open, a body is read to its end, anything but 200 ends the run. */
export function requester(baseUrl, headers = {}) {
  const { hostname, port } = new URL(baseUrl)
  const agent = new Agent({ keepAlive: true, maxSockets: 64 })
  return (path, { method = 'GET', body } = {}) => new Promise((resolve, reject) => {
    const more = body === undefined ? {} : { 'content-type': 'application/json', 'origin': baseUrl }
    const sent = request({ hostname, port, path, method, agent, headers: { ...headers, ...more } }, (answer) => {
      const chunks = []
      answer.on('data', chunk => chunks.push(chunk)).on('error', reject).on('end', () => {
        const text = Buffer.concat(chunks).toString()
        if (answer.statusCode === 200) resolve({ text, headers: answer.headers })
        else reject(new Mendable(`${method} ${path.slice(0, 80)} answered ${answer.statusCode}`, 'read the answer above', text.slice(0, 500)))
      })
    })
    sent.on('error', reject).end(body === undefined ? undefined : JSON.stringify(body))
  })
}

/** The cookie of a fresh sign-in. */
export async function signIn(baseUrl, { email, password }) {
  const { headers } = await requester(baseUrl, { accept: 'application/json' })('/api/auth/sign-in', { method: 'POST', body: { email, password } })
  return headers['set-cookie'].map(line => line.split(';')[0]).join('; ')
}

/** Asks for a page of jobs and checks that it has as many lines as it must. */
export function jobsAsker(baseUrl, cookie, { lines = 25 } = {}) {
  const ask = requester(baseUrl, { accept: 'application/json', ...(cookie && { cookie }) })
  return async (query = '') => {
    const { text } = await ask(`/api/jobs${query}`)
    const found = text.split('"ref":').length - 1
    if (found !== lines) throw new Mendable(`A page of the list came with ${found} lines instead of ${lines}`, 'look at the bench\'s data', text.slice(0, 300))
  }
}
