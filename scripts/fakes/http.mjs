import { createServer } from 'node:http'

/** Text made safe to stand in a page. */
export const escapeHtml = text => String(text ?? '').replace(/[&<>"']/g, sign => `&#${sign.charCodeAt(0)};`)

/** A plain page with no script; `body` is ready HTML. */
export function page(title, body) {
  return `<!doctype html><html lang="en-GB"><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1"><title>${escapeHtml(title)}</title>
<style>body{font:16px/1.5 system-ui,sans-serif;max-width:60rem;margin:2rem auto;padding:0 1rem}td,th{text-align:left;padding:.25rem 1rem .25rem 0;vertical-align:top}iframe{width:100%;height:32rem;border:1px solid #999}button{font:inherit;padding:.5rem 1rem;margin-right:1rem}pre{white-space:pre-wrap}</style>
<h1>${escapeHtml(title)}</h1>${body}</html>`
}

/** An answer of a route. */
export const json = (body, status = 200, headers = {}) => ({ status, headers: { 'content-type': 'application/json', ...headers }, body: JSON.stringify(body) })
export const html = (body, headers = {}) => ({ status: 200, headers: { 'content-type': 'text/html; charset=utf-8', 'content-security-policy': 'default-src \'none\'; style-src \'unsafe-inline\'; img-src data:; frame-src \'self\'; form-action *', ...headers }, body })
export const redirect = location => ({ status: 303, headers: { location }, body: '' })

async function readBody(request) {
  const chunks = []
  for await (const chunk of request) chunks.push(chunk)
  return Buffer.concat(chunks).toString('utf8')
}

/**
 * Serves routes on 127.0.0.1 until the process is told to stop.
 * @param {Array<[string, RegExp, (request: { params: string[], query: URLSearchParams, headers: object, body: string }) => unknown]>} routes
 */
export function serve(port, routes, { onStop } = {}) {
  const server = createServer(async (request, response) => {
    const url = new URL(request.url, 'http://127.0.0.1')
    const route = routes.find(([method, path]) => method === request.method && path.test(url.pathname))
    const send = ({ status, headers, body }) => response.writeHead(status, headers).end(body)
    if (!route) return send(json({ error: { type: 'invalid_request_error', message: `This stand-in does not know ${request.method} ${url.pathname}` } }, 404))
    try {
      const params = route[1].exec(url.pathname).slice(1).map(decodeURIComponent)
      send(await route[2]({ params, query: url.searchParams, headers: request.headers, body: await readBody(request) }))
    }
    catch (error) {
      // A refusal carries its own status; anything else is a fault of the stand-in.
      if (!error.status) console.error(error)
      send(json(error.body ?? { error: { type: 'api_error', message: error.message } }, error.status ?? 500))
    }
  })
  server.listen(port, '127.0.0.1')
  for (const signal of ['SIGTERM', 'SIGINT']) {
    process.on(signal, () => {
      server.closeAllConnections()
      server.close()
      onStop?.()
      process.exit(0)
    })
  }
  return server
}
