import { formatDay } from '#shared/utils/dates'
import { composeMessage, type Message, type Sender } from './frame/compose-message'

export interface NoticeCoverInput {
  from: Sender
  to: string
  reference: string
  address: string
  mpan: string
  /** What the notice is, as its own title: `Notice of a vehicle charging point`. */
  title: string
  asksFirst: boolean
  lastDay: string | null
  enclosed: string[]
  signedBy: string
}

/** The letter around a notice; the sheet itself is attached. */
export function noticeCoverMessage({ from, to, reference, address, mpan, title, asksFirst, lastDay, enclosed, signedBy }: NoticeCoverInput): Message {
  return composeMessage({
    subject: `${title}: ${address}, our reference ${reference}`,
    greeting: `To ${to},`,
    from,
    parts: [
      { kind: 'sentence', text: asksFirst ? 'We ask for your answer before anything is energised at these premises. The data sheet is attached.' : 'We tell you of a charging point that has been fitted at these premises. The data sheet is attached.' },
      { kind: 'facts', rows: [['Premises', address], ['Supply number', mpan], ['Our reference', reference], ['Last day for this notice', lastDay ? formatDay(lastDay) : 'None: work waits for your answer']] },
      { kind: 'list', items: enclosed.length ? enclosed : ['Data sheet'] },
      { kind: 'sentence', text: `Please answer with our reference. Signed for ${from.firmName}: ${signedBy}.` },
    ],
  })
}
