import { formatDay } from '#shared/utils/dates'
import { composeMessage, type Message, type Sender } from './frame/compose-message'

export interface SentBackInput { from: Sender, name: string, shortAddress: string, sentBackBy: string, remarks: { field: string, remark: string }[], dueBy: string | null, url: string }

export function sentBackMessage({ from, name, shortAddress, sentBackBy, remarks, dueBy, url }: SentBackInput): Message {
  const count = remarks.length === 1 ? '1 remark' : `${remarks.length} remarks`
  return composeMessage({
    subject: `Sent back: ${shortAddress}, ${count}`,
    greeting: `Dear ${name},`,
    from,
    parts: [
      { kind: 'sentence', text: `${sentBackBy} has sent back the sheet for ${shortAddress}. Each remark opens its own field; once all are answered the sheet returns by itself.` },
      { kind: 'facts', rows: remarks.map(({ field, remark }) => [field, remark]) },
      ...(dueBy ? [{ kind: 'sentence', text: `Needed by ${formatDay(dueBy)}.` } as const] : []),
      { kind: 'button', label: 'Answer the remarks', url },
    ],
  })
}
