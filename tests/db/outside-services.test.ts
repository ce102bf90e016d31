/** The gateways against the fakes, which speak the real contracts: SMTP and S3. */
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startFiles } from '@/fakes/files/start-files'
import { startMail } from '@/fakes/mail/start-mail'
import { fetchFile, putFile, removeFile } from '@/lib/gateways/files'
import { closeMail, sendMail } from '@/lib/gateways/mail'

const folder = mkdtempSync(join(tmpdir(), 'fuseward outside '))
const inFolder = (name: string) => join(folder, name)

let mail: Awaited<ReturnType<typeof startMail>>
let files: Awaited<ReturnType<typeof startFiles>>

beforeAll(async () => {
  mail = await startMail({ smtpPort: 0, webPort: 0, folder: inFolder('mail') })
  files = await startFiles({ port: 0, folder: inFolder('files'), bucket: 'fuseward' })
  process.env.MAIL_URL = mail.mailUrl
  process.env.FILES_ENDPOINT = files.endpoint
})
afterAll(async () => {
  closeMail()
  await Promise.all([mail.stop(), files.stop()])
  rmSync(folder, { recursive: true })
})

const LETTER = {
  id: '0198-an-invitation',
  to: 'owen@harrowgate.example',
  subject: 'Tŷ Môn: you are invited',
  text: 'Open http://localhost:3000/invitation/abc-123 within seven days.\n\nOr <b>ignore</b> it.',
  html: '<p>Open <a href="http://localhost:3000/invitation/abc-123">the invitation</a>.</p><script>alert(1)</script>',
}

describe('mail', () => {
  it('arrives as it was sent, with its id and its links', async () => {
    await sendMail(LETTER)
    const letters = (await (
      await fetch(`${mail.inbox}/messages?to=owen@harrowgate.example`)
    ).json()) as unknown[]
    expect(letters).toEqual([
      expect.objectContaining({
        messageId: '<0198-an-invitation@localhost>',
        to: ['owen@harrowgate.example'],
        from: 'no-reply@fuseward.example',
        subject: 'Tŷ Môn: you are invited',
        links: ['http://localhost:3000/invitation/abc-123'],
      }),
    ])
    expect(await (await fetch(`${mail.inbox}/messages?to=nobody@harrowgate.example`)).json()).toEqual([])
  })

  it('can be read by a person, and nothing in a letter runs', async () => {
    const inbox = await (await fetch(mail.inbox)).text()
    const path = /href="(\/messages\/[^"]+)"/.exec(inbox)?.[1]
    const answer = await fetch(`${mail.inbox}${path}`)
    const page = await answer.text()
    expect(page).toContain('href="http://localhost:3000/invitation/abc-123"')
    expect(page).toContain('&lt;b&gt;ignore&lt;/b&gt;')
    expect(page).not.toContain('<script')
    expect(answer.headers.get('content-security-policy')).toContain("default-src 'none'")
  })

  it('is still there after a restart, and gone when it is cleared', async () => {
    const again = await startMail({ smtpPort: 0, webPort: 0, folder: inFolder('mail') })
    const count = async () => ((await (await fetch(`${again.inbox}/messages`)).json()) as unknown[]).length
    expect(await count()).toBe(1)
    expect((await fetch(`${again.inbox}/messages`, { method: 'DELETE' })).status).toBe(204)
    expect(await count()).toBe(0)
    await again.stop()
  })
})

describe('files', () => {
  it('come back byte for byte, and go when removed', async () => {
    const bytes = Buffer.from(Array.from({ length: 300_000 }, (_, n) => (n * 31) % 251))
    writeFileSync(inFolder('given'), bytes)
    await putFile('imports/ŵ 1.xlsx', inFolder('given'), bytes.length)
    await fetchFile('imports/ŵ 1.xlsx', inFolder('fetched'))
    expect(readFileSync(inFolder('fetched')).equals(bytes)).toBe(true)

    await removeFile('imports/ŵ 1.xlsx')
    await expect(fetchFile('imports/ŵ 1.xlsx', inFolder('again'))).rejects.toMatchObject({
      name: 'NoSuchKey',
    })
    await expect(removeFile('imports/ŵ 1.xlsx')).resolves.toBeUndefined()
  })

  it('are still there after a restart', async () => {
    writeFileSync(inFolder('kept'), 'kept')
    await putFile('kept', inFolder('kept'), 4)
    await files.stop()
    const port = Number(new URL(files.endpoint).port)
    files = await startFiles({ port, folder: inFolder('files'), bucket: 'fuseward' })
    await fetchFile('kept', inFolder('kept-fetched'))
    expect(readFileSync(inFolder('kept-fetched'), 'utf8')).toBe('kept')
  })
})
