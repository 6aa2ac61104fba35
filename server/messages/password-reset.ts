import { formatMoment } from '#shared/utils/dates'
import { composeMessage, type Message, type Sender } from './frame/compose-message'

export interface PasswordResetInput { from: Sender, name: string, url: string, until: string }

export function passwordResetMessage({ from, name, url, until }: PasswordResetInput): Message {
  return composeMessage({
    subject: 'A link to choose a new password',
    greeting: `Dear ${name},`,
    from,
    parts: [
      { kind: 'sentence', text: 'Someone, we think you, asked for a new password. Your old one still works until you choose another.' },
      { kind: 'button', label: 'Choose a new password', url },
      { kind: 'sentence', text: `The link works once, until ${formatMoment(until)}. If you did not ask, do nothing and tell your firm.` },
    ],
  })
}
