import { formatMoment } from '#shared/utils/dates'
import { composeMessage, type Message, type Sender } from './frame/compose-message'

export interface InvitationInput { from: Sender, name: string, invitedBy: string, /** `installer`, `supervisor` … as the person reads it. */ roles: string[], url: string, until: string }

export function invitationMessage({ from, name, invitedBy, roles, url, until }: InvitationInput): Message {
  return composeMessage({
    subject: `${from.firmName} has invited you to its jobs`,
    greeting: `Dear ${name},`,
    from,
    parts: [
      { kind: 'sentence', text: `${invitedBy} has invited you to work with ${from.firmName} as ${roles.join(' and ')}. Choose a password to start.` },
      { kind: 'button', label: 'Choose a password', url },
      { kind: 'sentence', text: `The link works once, until ${formatMoment(until)}. If you do not know the firm, do nothing.` },
    ],
  })
}
