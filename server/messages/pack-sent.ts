import { composeMessage, type Message, type Sender } from './frame/compose-message'

export interface PackSentInput {
  from: Sender
  customerName: string
  shortAddress: string
  /** `WRN-2027-00042 A` */
  certificate: string
  fourWords: readonly string[]
  /** `Replaces WRN-2027-00042 A: …`, or null for a first issue. */
  replaces: string | null
  isPdfAttached: boolean
  /** Days for which the link opens the pack. */
  days: number
  url: string
}

export function packSentMessage({ from, customerName, shortAddress, certificate, fourWords, replaces, isPdfAttached, days, url }: PackSentInput): Message {
  return composeMessage({
    subject: `Your certificate for ${shortAddress}`,
    greeting: `Dear ${customerName},`,
    from,
    parts: [
      { kind: 'sentence', text: 'The work is finished, tested and signed. Your pack has two doors: how to live with the charging point, and the papers that prove it.' },
      { kind: 'facts', rows: [['Certificate', certificate], ['Four words of its seal', fourWords.join(' · ')], ...(replaces ? [['Takes the place of', replaces] as [string, string]] : [])] },
      { kind: 'button', label: 'Open the pack', url },
      { kind: 'sentence', text: `The page asks for your postcode once. The link works for ${days} days; after that the page can send a fresh one to this address. ${isPdfAttached ? 'The whole pack is attached as a PDF: keep it.' : 'The whole pack is on that page as a PDF: keep it.'}` },
    ],
  })
}
