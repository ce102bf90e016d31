/** Sends e-mail by SMTP. Which server is a matter of the URL alone. */
import { createTransport, type Transporter } from 'nodemailer'
import { env } from '@/lib/platform/env'

export type Mail = { id: string; to: string; subject: string; text: string; html: string }

let transport: Transporter | undefined

function connect(): Transporter {
  const { MAIL_URL } = env()
  const at = new URL(MAIL_URL)
  return createTransport({
    host: at.hostname,
    port: Number(at.port || (at.protocol === 'smtps:' ? 465 : 587)),
    secure: at.protocol === 'smtps:',
    ignoreTLS: at.hostname === '127.0.0.1',
    auth: at.username
      ? { user: decodeURIComponent(at.username), pass: decodeURIComponent(at.password) }
      : undefined,
    pool: true,
    connectionTimeout: 10_000,
    greetingTimeout: 10_000,
    socketTimeout: 30_000,
  })
}

/**
 * Hands one e-mail to the server. The id becomes the Message-ID, so a second try can be told from a second notice.
 * @throws Error where the server refuses it or does not answer
 */
export async function sendMail(mail: Mail): Promise<void> {
  const { MAIL_FROM, NEXTAUTH_URL } = env()
  await (transport ??= connect()).sendMail({
    from: MAIL_FROM,
    to: mail.to,
    subject: mail.subject,
    text: mail.text,
    html: mail.html,
    messageId: `<${mail.id}@${new URL(NEXTAUTH_URL).hostname}>`,
    headers: { 'Auto-Submitted': 'auto-generated' },
  })
}

/** Lets go of the connection, for a process that ends. */
export function closeMail(): void {
  transport?.close()
  transport = undefined
}
