/** The main job as a person does it: sign up, bring the list, see the ranking, open the worst home, find the fuses, take them away. */
import { readFileSync } from 'node:fs'
import { resolve } from 'node:path'
import { expect } from '@playwright/test'
import { parse } from 'csv-parse/sync'
import { test } from './viewers'

const fixtures = resolve(import.meta.dirname, '../fixtures')
const expected = JSON.parse(readFileSync(resolve(fixtures, 'quillhaven-stock.expected.json'), 'utf8')) as {
  accepted: number
  board: Record<string, number>
  rewireable_by_patch: Record<string, number>
}
const rewireable = (expected.board.rewireable ?? 0) + (expected.board.mixed ?? 0)

/** The link in the newest letter to somebody. */
async function linkInLetter(to: string): Promise<string> {
  const inbox = process.env.E2E_INBOX
  for (let tries = 0; tries < 40; tries += 1) {
    const letters = (await (await fetch(`${inbox}/messages?to=${encodeURIComponent(to)}`)).json()) as {
      links: string[]
    }[]
    const link = letters.flatMap(({ links }) => links)[0]
    if (link) return link
    await new Promise((done) => setTimeout(done, 250))
  }
  throw new Error(`no letter reached ${to}`)
}

test('from sign-up to the homes with rewireable fuses in a file', async ({ page }) => {
  test.setTimeout(180_000)
  const email = `landlord-${Date.now()}@tallow.example`

  await page.goto('/')
  await page
    .getByRole('link', { name: /start|sign up/i })
    .first()
    .click()
  await page.getByLabel('Your name').fill('Petra Fennimore')
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('The name you let as').fill('Fennimore Lettings')
  await page.getByLabel('Nation where your homes are').selectOption('england')
  await page.getByRole('button', { name: 'Start a register' }).click()
  await expect(page.getByText(email)).toBeVisible()

  await page.goto(await linkInLetter(email))
  await page.locator('input[type=password]').first().fill('tallow candle on the quay')
  await page.locator('main button[type=submit]').click()
  await page.waitForURL('**/today')

  await page.getByRole('link', { name: 'Import a stock list' }).first().click()
  await page.locator('input[type=file]').setInputFiles(resolve(fixtures, 'quillhaven-stock.xlsx'))
  await page.getByRole('button', { name: 'Upload and choose columns' }).click()
  await expect(page.getByRole('heading', { name: 'What each column is' })).toBeVisible({ timeout: 30_000 })
  await page.getByRole('button', { name: 'Check every row' }).click()
  await expect(page.getByText('10 rows will be left out')).toBeVisible({ timeout: 60_000 })
  await expect(page.getByRole('cell', { name: 'impossible date' }).first()).toBeVisible()
  await page.getByRole('button', { name: `Take in ${expected.accepted} homes` }).click()
  await expect(page.getByText(`${expected.accepted} homes added`).first()).toBeVisible({ timeout: 90_000 })

  await page.getByRole('link', { name: 'See the ranking' }).click()
  await page.waitForURL('**/homes')
  await expect(page.locator('tbody tr')).toHaveCount(50)
  const scores = (await page.locator('tbody td:last-child .figures').allTextContents()).map((text) =>
    Number(text.replaceAll(',', '')),
  )
  expect(scores).toEqual([...scores].sort((a, b) => b - a))
  const worst = page.locator('tbody a').first()
  const address = (await worst.textContent()) ?? ''
  await worst.click()
  await expect(page.getByRole('heading', { level: 1, name: address })).toBeVisible()
  await expect(page.getByText(/Why it ranks 1st of/)).toBeVisible()

  await page.getByRole('link', { name: 'Homes', exact: true }).first().click()
  await page.getByRole('link', { name: 'Which homes still have rewireable fuses?' }).click()
  await expect(
    page.getByText(
      `${rewireable} with rewireable fuses, ${expected.board.unknown} more not known, of ${expected.accepted}`,
    ),
  ).toBeVisible()
  for (const [patch, homes] of Object.entries(expected.rewireable_by_patch))
    await expect(page.getByRole('row', { name: new RegExp(`^${patch} ${homes} `) })).toBeVisible()

  await page.getByRole('button', { name: 'Export what is shown' }).click()
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('menuitem', { name: /csv/i }).click(),
  ])
  const rows = parse(readFileSync(await download.path(), 'utf8'), { bom: true, columns: true }) as Record<
    string,
    string
  >[]
  expect(rows).toHaveLength(rewireable)
  expect(new Set(rows.map((row) => row['Consumer unit']))).toEqual(
    new Set(['Rewireable fuses', 'Mixed, some rewireable']),
  )
})
