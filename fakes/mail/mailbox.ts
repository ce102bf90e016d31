/** The letters that came in, newest first, kept in a folder so that a restart loses none. */
import { randomUUID } from 'node:crypto'
import { mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { simpleParser, type AddressObject, type ParsedMail } from 'mailparser'

export type Letter = {
  readonly id: string
  readonly messageId: string | null
  readonly receivedAt: string
  readonly from: string
  readonly to: readonly string[]
  readonly subject: string
  readonly text: string
  readonly html: string | null
  /** every address of a page in the text, in order */
  readonly links: readonly string[]
}

/** Older letters than this many are let go. */
const KEPT = 500

const addresses = (given: AddressObject | AddressObject[] | undefined): string[] =>
  [given ?? []].flat().flatMap((group) => group.value.flatMap((one) => one.address ?? []))

function letterOf(id: string, mail: ParsedMail, receivedAt: string, recipients?: readonly string[]): Letter {
  const text = mail.text ?? ''
  return {
    id,
    messageId: mail.messageId ?? null,
    receivedAt,
    from: addresses(mail.from)[0] ?? '',
    to: recipients ?? addresses(mail.to),
    subject: mail.subject ?? '',
    text,
    html: mail.html || null,
    links: [...new Set(text.match(/https?:\/\/[^\s<>"')\]]+/g) ?? [])],
  }
}

export type Mailbox = {
  take: (raw: Buffer, recipients: readonly string[]) => Promise<Letter>
  list: (recipient?: string) => readonly Letter[]
  find: (id: string) => Letter | undefined
  empty: () => void
}

/** Opens the mailbox of a folder, with what it already holds. */
export async function openMailbox(folder: string): Promise<Mailbox> {
  mkdirSync(folder, { recursive: true })
  const files = () =>
    readdirSync(folder)
      .filter((name) => name.endsWith('.eml'))
      .sort()
  const remove = (name: string) => rmSync(join(folder, name), { force: true })
  let letters: Letter[] = []
  for (const name of files()) {
    const receivedAt = new Date(Number(name.split('-', 1)[0])).toISOString()
    letters.unshift(
      letterOf(name.slice(0, -4), await simpleParser(readFileSync(join(folder, name))), receivedAt),
    )
  }

  return {
    async take(raw, recipients) {
      const now = new Date()
      const id = `${now.getTime()}-${randomUUID()}`
      const letter = letterOf(id, await simpleParser(raw), now.toISOString(), recipients)
      writeFileSync(join(folder, `${id}.eml`), raw)
      letters.unshift(letter)
      for (const old of letters.splice(KEPT)) remove(`${old.id}.eml`)
      return letter
    },
    list: (recipient) => letters.filter(({ to }) => !recipient || to.includes(recipient)),
    find: (id) => letters.find((letter) => letter.id === id),
    empty() {
      letters = []
      files().forEach(remove)
    },
  }
}
