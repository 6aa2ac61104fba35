import { escapeHtml, oneLine, ownAddress } from './safe-text'

export interface Message { subject: string, text: string, html: string }

/** What a message is made of, in order; each part is said alike in the text and in the HTML. */
export type MessagePart =
  | { kind: 'sentence', text: string }
  | { kind: 'list', items: string[] }
  | { kind: 'facts', rows: [label: string, value: string][] }
  | { kind: 'button', label: string, url: string }

export interface MessageInput {
  /** Leads with the fact. */
  subject: string
  greeting: string
  parts: MessagePart[]
  /** Who writes, and how to reach them. */
  from: Sender
}

export interface Sender {
  firmName: string
  firmTelephone: string
  /** The signed head of the firm's audit chain, so that the reader holds a copy; null where there is none to give. */
  auditHead: string | null
}

/** One message as subject, plain text and HTML with the same content. */
export function composeMessage({ subject, greeting, parts, from }: MessageInput): Message {
  const closing = closingLines(from)
  return {
    subject: oneLine(subject),
    text: [greeting, ...parts.map(textPart), closing.join('\n')].join('\n\n') + '\n',
    html: htmlPage(oneLine(subject), [paragraph(greeting), ...parts.map(htmlPart)].join('\n'), closing),
  }
}

function closingLines(from: Sender): string[] {
  return [from.firmName, `Telephone ${from.firmTelephone}`, ...(from.auditHead ? [`Head of our record of events: ${from.auditHead}`] : [])]
}

function textPart(part: MessagePart): string {
  switch (part.kind) {
    case 'sentence': return part.text
    case 'list': return part.items.map(item => `- ${item}`).join('\n')
    case 'facts': return part.rows.map(([label, value]) => `${label}: ${value}`).join('\n')
    case 'button': return `${part.label}:\n${ownAddress(part.url)}`
    default: return part satisfies never
  }
}

const INK = '#14202b'
const PLUM = '#5b2a6e'
const FONT = 'Inter, system-ui, -apple-system, \'Segoe UI\', Roboto, Arial, sans-serif'

const paragraph = (text: string) => `<p style="margin:0 0 16px">${escapeHtml(text)}</p>`

function htmlPart(part: MessagePart): string {
  switch (part.kind) {
    case 'sentence': return paragraph(part.text)
    case 'list': return `<ul style="margin:0 0 16px;padding:0 0 0 20px">${part.items.map(item => `<li style="margin:0 0 4px">${escapeHtml(item)}</li>`).join('')}</ul>`
    case 'facts': return `<table style="margin:0 0 16px;border-collapse:collapse;width:100%">${part.rows.map(factRow).join('')}</table>`
    case 'button': return button(part.label, ownAddress(part.url))
    default: return part satisfies never
  }
}

function factRow([label, value]: [string, string]): string {
  return `<tr><th scope="row" style="padding:6px 16px 6px 0;border-top:1px solid #757b78;text-align:left;font-weight:400;vertical-align:top;width:38%">${escapeHtml(label)}</th><td style="padding:6px 0;border-top:1px solid #757b78;font-weight:600;vertical-align:top">${escapeHtml(value)}</td></tr>`
}

/** The one button, and the bare address for a reader that shows no buttons. */
function button(label: string, url: string): string {
  const address = escapeHtml(url)
  return `<p style="margin:0 0 8px"><a href="${address}" style="display:inline-block;padding:12px 20px;background:${PLUM};color:#ffffff;text-decoration:none;font-weight:600;border-radius:2px">${escapeHtml(label)}</a></p>
<p style="margin:0 0 16px;word-break:break-all"><a href="${address}" style="color:${PLUM}">${address}</a></p>`
}

function htmlPage(subject: string, body: string, closing: string[]): string {
  return `<!doctype html>
<html lang="en-GB">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<meta name="color-scheme" content="light dark">
<meta name="supported-color-schemes" content="light dark">
<title>${escapeHtml(subject)}</title>
</head>
<body style="margin:0;padding:0;background:#ffffff;color:${INK};font-family:${FONT};font-size:16px;line-height:1.5">
<div style="max-width:600px;margin:0 auto;padding:24px 16px">
${body}
<p style="margin:24px 0 0;padding:12px 0 0;border-top:1px solid #757b78;font-size:14px;word-break:break-word">${closing.map(escapeHtml).join('<br>')}</p>
</div>
</body>
</html>
`
}
