/** What waits in the outbox for an address, oldest first, with the token of its link. */
import { deployment } from '@/db/connection'

export type WaitingLetter = {
  organisationId: string
  subject: string
  text: string
  html: string
  token: string | null
}

type Row = { organisation_id: string; subject: string; body_text: string; body_html: string }

/** @example const [letter] = await lettersTo('pat@lets.example') */
export async function lettersTo(email: string): Promise<WaitingLetter[]> {
  const rows = (await deployment().db('outbox').where({ recipient: email }).orderBy('id')) as Row[]
  return rows.map((row) => ({
    organisationId: row.organisation_id,
    subject: row.subject,
    text: row.body_text,
    html: row.body_html,
    token: /\/([\w-]{43})(\s|$)/.exec(row.body_text)?.[1] ?? null,
  }))
}

/** The token of the last letter to an address. */
export async function tokenTo(email: string): Promise<string> {
  const token = (await lettersTo(email)).at(-1)?.token
  if (!token) throw new Error(`The last letter to ${email} holds no link`)
  return token
}
