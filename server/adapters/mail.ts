/** Hands one message to the mail server. What came of it is told apart: taken, try later, refused, or nobody can say. */
import nodemailer, { type Transporter } from 'nodemailer'
import { config } from '../utils/config'

export interface Letter {
  to: string
  subject: string
  text: string
  html: string
  messageId: string
  attachments?: { filename: string, content: Buffer, contentType: string }[]
}

export type Delivery = { came: 'taken' } | { came: 'later' | 'refused' | 'unclear', why: string }

let transport: Transporter | undefined

function transporter(): Transporter {
  const { mail } = config()
  if (!mail) throw new Error('No mail server is configured')
  return transport ??= nodemailer.createTransport({ host: mail.host, port: mail.port, secure: mail.secure, ignoreTLS: !mail.secure && !mail.user, auth: mail.user ? { user: mail.user, pass: mail.password } : undefined, connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 45_000, disableFileAccess: true, disableUrlAccess: true })
}

interface SmtpError { code?: string, responseCode?: number, command?: string, message: string }

export async function deliver(letter: Letter): Promise<Delivery> {
  try {
    await transporter().sendMail({ from: config().mail!.from, ...letter })
    return { came: 'taken' }
  }
  catch (error) {
    return tellApart(error as SmtpError)
  }
}

/** A conversation that broke off after the message was handed over may have been taken: nobody can say. */
function tellApart({ code, responseCode, command, message }: SmtpError): Delivery {
  const why = message.split('\n')[0]!.slice(0, 300)
  if (responseCode && responseCode >= 500) return { came: 'refused', why }
  if (responseCode && responseCode >= 400) return { came: 'later', why }
  if (command === 'DATA' && code !== 'EENVELOPE') return { came: 'unclear', why }
  return { came: 'later', why }
}
