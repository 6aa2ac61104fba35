import { findTestServer } from '../../support/test-addresses'

interface Summary { id: string, to: string[], subject: string }
export interface Letter extends Summary { text: string, html: string, attachments: { filename: string, size: number }[] }

const address = () => findTestServer()!.TEST_MAIL_URL

/** Waits for a letter to the address whose subject has the words given. */
export async function letterTo(to: string, subject: RegExp, within_s = 60): Promise<Letter> {
  const until = Date.now() + within_s * 1000
  for (;;) {
    const list = await fetch(`${address()}/messages?to=${encodeURIComponent(to)}`).then(answer => answer.json()) as Summary[]
    const found = list.filter(letter => subject.test(letter.subject)).at(-1)
    if (found) return await fetch(`${address()}/messages/${found.id}`).then(answer => answer.json()) as Letter
    if (Date.now() > until) throw new Error(`No letter to ${to} about ${String(subject)}; there are: ${list.map(letter => letter.subject).join(', ') || 'none'}`)
    await new Promise(resolve => setTimeout(resolve, 250))
  }
}

export async function attachmentOf(letter: Letter, at: number): Promise<Buffer> {
  const bytes = await fetch(`${address()}/messages/${letter.id}/attachments/${at}`).then(answer => answer.arrayBuffer())
  return Buffer.from(new Uint8Array(bytes))
}

/** The first link of our own in a letter. */
export function linkIn(letter: Letter): string {
  const link = /https?:\/\/\S+\/c\/\S+/.exec(letter.text)?.[0]
  if (!link) throw new Error(`No link in "${letter.subject}"`)
  return link
}
