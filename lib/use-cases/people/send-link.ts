/** Letters that carry a link in place of a sign-in. */
import { type WritingScope } from '@/db/connection'
import * as outbox from '@/db/repositories/outbox'
import { type Letter, letterBodies } from '@/lib/notices/letter'
import { env } from '@/lib/platform/env'
import { tokenHash } from '@/lib/platform/secret-token'

type Link = Omit<Letter, 'link'> & {
  to: string
  subject: string
  /** what the letter is, for the key that makes it go once */
  kind: string
  linkText: string
  /** without the token */
  path: string
  token: string
}

/** Puts a letter with a link in the outbox, in the transaction that made the token. */
export async function sendLink(scope: WritingScope, letter: Link): Promise<void> {
  const href = new URL(`${letter.path}/${letter.token}`, env().NEXTAUTH_URL).href
  const { paragraphs, closing, to, subject, kind, linkText, token } = letter
  const bodies = letterBodies({ paragraphs, closing, link: { text: linkText, href } })
  await outbox.enqueue(scope, {
    businessKey: `${kind}/${tokenHash(token).slice(0, 32)}`,
    to,
    subject,
    ...bodies,
  })
}

/** Puts a letter with a link that is no secret in the outbox. */
export async function sendNotice(
  scope: WritingScope,
  letter: Omit<Link, 'token' | 'kind'> & { businessKey: string },
): Promise<void> {
  const { paragraphs, closing, to, subject, linkText, path, businessKey } = letter
  const bodies = letterBodies({
    paragraphs,
    closing,
    link: { text: linkText, href: new URL(path, env().NEXTAUTH_URL).href },
  })
  await outbox.enqueue(scope, { businessKey, to, subject, ...bodies })
}
