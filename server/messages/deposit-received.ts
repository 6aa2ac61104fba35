import { formatPounds } from '#shared/utils/money'
import { composeMessage, type Message, type Sender } from './frame/compose-message'

export interface DepositReceivedInput { from: Sender, customerName: string, shortAddress: string, quoteNumber: string, paid_pence: number, balance_pence: number, next: string, url: string }

export function depositReceivedMessage({ from, customerName, shortAddress, quoteNumber, paid_pence, balance_pence, next, url }: DepositReceivedInput): Message {
  return composeMessage({
    subject: `Deposit received: ${formatPounds(paid_pence)} for ${shortAddress}`,
    greeting: `Dear ${customerName},`,
    from,
    parts: [
      { kind: 'facts', rows: [['Quote', quoteNumber], ['Received', formatPounds(paid_pence)], ['Left to pay after the work', formatPounds(balance_pence)]] },
      { kind: 'sentence', text: next },
      { kind: 'button', label: 'See what happens next', url },
    ],
  })
}
