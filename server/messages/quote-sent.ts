import { formatDay } from '#shared/utils/dates'
import { formatPounds } from '#shared/utils/money'
import { composeMessage, type Message, type Sender } from './frame/compose-message'

export interface QuoteSentInput { from: Sender, customerName: string, shortAddress: string, number: string, gross_pence: number, deposit_pence: number, validUntil: string, url: string }

export function quoteSentMessage({ from, customerName, shortAddress, number, gross_pence, deposit_pence, validUntil, url }: QuoteSentInput): Message {
  return composeMessage({
    subject: `Your quote for ${shortAddress}: ${formatPounds(gross_pence)}`,
    greeting: `Dear ${customerName},`,
    from,
    parts: [
      { kind: 'facts', rows: [['Quote', number], ['Price with VAT', formatPounds(gross_pence)], ['Deposit on acceptance', formatPounds(deposit_pence)], ['Stands until', formatDay(validUntil)]] },
      { kind: 'sentence', text: 'Read it, ask about any line, and accept it on this page. You need no account.' },
      { kind: 'button', label: 'Read the quote', url },
    ],
  })
}
