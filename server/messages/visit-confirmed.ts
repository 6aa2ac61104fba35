import { formatDay } from '#shared/utils/dates'
import { composeMessage, type Message, type Sender } from './frame/compose-message'

export interface VisitConfirmedInput {
  from: Sender
  customerName: string
  shortAddress: string
  /** `Survey`, `Installation`, `Return visit` */
  what: string
  day: string
  half: 'morning' | 'afternoon'
  who: string[]
  /** What to have ready: parking, access to the board … */
  prepare: string[]
  url: string
}

export function visitConfirmedMessage({ from, customerName, shortAddress, what, day, half, who, prepare, url }: VisitConfirmedInput): Message {
  return composeMessage({
    subject: `${what} on ${formatDay(day)}, ${half}, at ${shortAddress}`,
    greeting: `Dear ${customerName},`,
    from,
    parts: [
      { kind: 'facts', rows: [['What', what], ['When', `${formatDay(day)}, ${half}`], ['Where', shortAddress], ['Who', who.join(', ') || 'To be named']] },
      ...(prepare.length ? [{ kind: 'sentence', text: 'Please have this ready:' } as const, { kind: 'list', items: prepare } as const] : []),
      { kind: 'sentence', text: 'If the day no longer suits you, move it on this page.' },
      { kind: 'button', label: 'See or move the visit', url },
    ],
  })
}
