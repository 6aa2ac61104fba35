import { describe, expect, it } from 'vitest'
import { depositReceivedMessage } from '#server/messages/deposit-received'
import type { Message } from '#server/messages/frame/compose-message'
import { invitationMessage } from '#server/messages/invitation'
import { noticeCoverMessage } from '#server/messages/notice-cover'
import { packSentMessage } from '#server/messages/pack-sent'
import { passwordResetMessage } from '#server/messages/password-reset'
import { quoteSentMessage } from '#server/messages/quote-sent'
import { sentBackMessage } from '#server/messages/sent-back'
import { visitConfirmedMessage } from '#server/messages/visit-confirmed'

const URL_OF_PAGE = 'https://charge.example/p/abc?x=1&y=2'
const HEAD = 'a'.repeat(64)

/** Every message, with one text put in wherever a person's or a firm's words go. */
function everyMessage(words: string): Record<string, Message> {
  const from = { firmName: words, firmTelephone: words, auditHead: HEAD }
  const base = { from, name: words, customerName: words, shortAddress: words, url: URL_OF_PAGE }
  return {
    'invitation': invitationMessage({ ...base, invitedBy: words, roles: [words], until: '2027-03-02T10:00:00Z' }),
    'password-reset': passwordResetMessage({ ...base, until: '2027-03-02T10:00:00Z' }),
    'quote-sent': quoteSentMessage({ ...base, number: words, gross_pence: 98400, deposit_pence: 20000, validUntil: '2027-03-03' }),
    'deposit-received': depositReceivedMessage({ ...base, quoteNumber: words, paid_pence: 20000, balance_pence: 78400, next: words }),
    'pack-sent': packSentMessage({ ...base, certificate: words, fourWords: ['lantern', 'orchard', 'seven', 'gravel'], replaces: words, isPdfAttached: true, days: 30 }),
    'visit-confirmed': visitConfirmedMessage({ ...base, what: words, day: '2027-03-02', half: 'morning', who: [words], prepare: [words] }),
    'notice-cover': noticeCoverMessage({ from, to: words, reference: words, address: words, mpan: words, title: words, asksFirst: false, lastDay: '2027-03-30', enclosed: [words], signedBy: words }),
    'sent-back': sentBackMessage({ ...base, sentBackBy: words, remarks: [{ field: words, remark: words }], dueBy: '2027-03-05' }),
  }
}

const plain = Object.entries(everyMessage('19 Hill Street'))
const hostile = Object.entries(everyMessage('"><script>alert(1)</script><img src=x onerror=\'y\'>&\r\nBcc: thief@evil.example\u2028\u202e'))

/** The words of an HTML message, as a reader would see them. */
const wordsOf = (html: string) => html.slice(html.indexOf('<body')).replace(/<[^>]+>/g, ' ').replace(/&amp;/g, '&').replace(/&#39;/g, '\'').replace(/&quot;/g, '"').replace(/&lt;/g, '<').replace(/&gt;/g, '>').replace(/\s+/g, ' ').trim()

describe('the fact leads the subject', () => {
  const subjects = Object.fromEntries(plain.map(([name, message]) => [name, message.subject]))
  it.each([
    ['pack-sent', 'Your certificate for 19 Hill Street'],
    ['quote-sent', 'Your quote for 19 Hill Street: £984.00'],
    ['deposit-received', 'Deposit received: £200.00 for 19 Hill Street'],
    ['visit-confirmed', '19 Hill Street on Tue 2 Mar 2027, morning, at 19 Hill Street'],
    ['sent-back', 'Sent back: 19 Hill Street, 1 remark'],
  ])('%s', (name, subject) => {
    expect(subjects[name]).toBe(subject)
  })
})

describe.each(plain)('%s', (_, message) => {
  it('says the same in text and in HTML', () => {
    const seen = wordsOf(message.html)
    for (const line of message.text.split('\n').filter(Boolean)) {
      for (const piece of line.replace(/^- /, '').split(/: |:$/).filter(Boolean)) expect(seen).toContain(piece)
    }
  })

  it('carries the head of the record of events', () => {
    expect(message.text).toContain(HEAD)
    expect(message.html).toContain(HEAD)
  })

  it('asks for nothing from outside and stays small', () => {
    expect(message.html).not.toMatch(/<(img|link|script|style|iframe)|url\(|src=/i)
    for (const [, address] of message.html.matchAll(/href="([^"]+)"/g)) expect(address).toBe(URL_OF_PAGE.replace('&', '&amp;'))
    expect(Buffer.byteLength(message.html)).toBeLessThan(100_000)
    expect(message.html).toContain('max-width:600px')
  })

  it('shouts at nobody', () => {
    expect(message.subject + message.text).not.toContain('!')
  })
})

describe.each(hostile)('%s with hostile words', (_, message) => {
  it('keeps the subject on one line', () => {
    expect(message.subject).not.toMatch(/[\p{Cc}\u2028\u2029\u202a-\u202e]/u)
    expect([...message.subject].length).toBeLessThanOrEqual(150)
  })

  it('shows the words and runs none of them', () => {
    expect(message.html).not.toMatch(/<script|<img/i)
    expect(message.html).toContain('&lt;script&gt;')
  })
})

it('links to a page only', () => {
  const from = { firmName: 'Firm', firmTelephone: '1', auditHead: null }
  expect(() => passwordResetMessage({ from, name: 'A', url: 'javascript:alert(1)', until: '2027-03-02T10:00:00Z' })).toThrow('links to a page')
})
