import { escapeHtml, html, json, page } from './http.mjs'

const missing = () => json({ error: { message: 'There is no such message' } }, 404)

/** What a list shows of a message. */
function toSummary({ id, receivedAt, from, to, parsed }) {
  return { id, receivedAt, from, to, subject: parsed.subject ?? '', messageId: parsed.messageId ?? null, attachments: parsed.attachments.map(({ filename, contentType, size }) => ({ filename, contentType, size })) }
}

function toDetail(message) {
  const { parsed } = message
  return { ...toSummary(message), text: parsed.text ?? '', html: parsed.html || '', headers: Object.fromEntries(parsed.headerLines.map(({ key, line }) => [key, line.slice(line.indexOf(':') + 1).trim()])) }
}

function listPage(messages) {
  const rows = [...messages].reverse().map(message => `<tr><td>${escapeHtml(message.receivedAt)}</td><td>${escapeHtml(message.to.join(', '))}</td><td><a href="/view/${message.id}">${escapeHtml(message.parsed.subject || 'No subject')}</a></td><td>${message.parsed.attachments.length || ''}</td></tr>`)
  return page('Messages held on this machine', messages.length === 0
    ? '<p>Nothing has been sent yet. Messages that Copperplate sends come here and go no further.</p>'
    : `<p>These went no further than this machine. Newest first.</p><table><tr><th>Received</th><th>To</th><th>Subject</th><th>Attachments</th></tr>${rows.join('')}</table>`)
}

/** Web addresses become links, so that a link in a message can be followed from here. */
const withLinks = text => text.split(/(https?:\/\/[^\s<>"]+)/).map((part, n) => n % 2 ? `<a href="${escapeHtml(part)}">${escapeHtml(part)}</a>` : escapeHtml(part)).join('')

function messagePage({ id, from, to, parsed }) {
  const attached = parsed.attachments.map(({ filename, size }, n) => `<li><a href="/messages/${id}/attachments/${n}">${escapeHtml(filename ?? `Attachment ${n + 1}`)}</a> (${size} bytes)</li>`)
  return page(parsed.subject || 'No subject', `<p><a href="/">All messages</a> · <a href="/messages/${id}">As data</a></p><p>From ${escapeHtml(from)} to ${escapeHtml(to.join(', '))}</p>
${attached.length > 0 ? `<h2>Attachments</h2><ul>${attached.join('')}</ul>` : ''}<h2>As text</h2><pre>${withLinks(parsed.text ?? '')}</pre>
${parsed.html ? `<h2>As a page</h2><iframe title="The message as a page" sandbox="allow-popups allow-top-navigation-by-user-activation" src="/view/${id}/page"></iframe>` : ''}`)
}

function attachment({ parsed }, n) {
  const file = parsed.attachments[n]
  if (!file) return missing()
  const name = encodeURIComponent(file.filename ?? `attachment-${n}`)
  return { status: 200, headers: { 'content-type': file.contentType, 'x-content-type-options': 'nosniff', 'content-disposition': `inline; filename*=UTF-8''${name}` }, body: file.content }
}

/** Routes of the message page and of its data, over the list that the mail server fills. */
export function mailRoutes(box, behaviour) {
  const found = (id, then) => {
    const message = box.messages.find(held => held.id === id)
    return message ? then(message) : missing()
  }
  return [
    ['GET', /^\/health$/, () => json({ well: true })],
    ['GET', /^\/$/, () => html(listPage(box.messages))],
    ['GET', /^\/view\/([\w-]+)$/, ({ params: [id] }) => found(id, message => html(messagePage(message)))],
    ['GET', /^\/view\/([\w-]+)\/page$/, ({ params: [id] }) => found(id, message => html(`<base target="_top">${message.parsed.html || ''}`))],
    ['GET', /^\/messages$/, ({ query }) => json(box.messages.filter(({ to }) => !query.get('to') || to.includes(query.get('to').toLowerCase())).map(toSummary))],
    ['GET', /^\/messages\/([\w-]+)$/, ({ params: [id] }) => found(id, message => json(toDetail(message)))],
    ['GET', /^\/messages\/([\w-]+)\/attachments\/(\d+)$/, ({ params: [id, n] }) => found(id, message => attachment(message, Number(n)))],
    ['DELETE', /^\/messages$/, () => {
      box.clear()
      return json({ messages: 0 })
    }],
    ['GET', /^\/behaviour$/, () => json({ rules: behaviour.list() })],
    ['POST', /^\/behaviour$/, ({ body }) => {
      try {
        behaviour.set(JSON.parse(body))
      }
      catch (error) {
        return json({ error: { message: error.message } }, 400)
      }
      return json({ rules: behaviour.list() })
    }],
    ['DELETE', /^\/behaviour$/, () => {
      behaviour.clear()
      return json({ rules: [] })
    }],
  ]
}
