/** Takes a picture of every page in pages.ts: `node --import tsx tests/e2e/take-pictures.ts --url U --sign-ins F --into D` */
import { mkdirSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import { parseArgs } from 'node:util'
import { type Browser, type BrowserContext, chromium, type Page } from '@playwright/test'
import { CHROMIUM } from './chromium'
import { PAGES, type PictureOf, type Viewer } from './pages'
import { demoPerson, demoSignIns, signIn } from './sign-in'

const WIDTHS = [1440, 390] as const
const THEMES = ['light', 'dark'] as const

const { values } = parseArgs({
  options: {
    url: { type: 'string', default: 'http://localhost:3000' },
    'sign-ins': { type: 'string', default: '.data/demo-sign-ins.json' },
    into: { type: 'string', default: '.data/shots' },
    only: { type: 'string', default: '' },
  },
})
const people = demoSignIns(values['sign-ins'])
const wanted = PAGES.filter(({ name }) => name.startsWith(values.only))
const problems: string[] = []

type State = Awaited<ReturnType<BrowserContext['storageState']>>

/** A viewer signs in once; every later context of theirs starts from what that left in the browser. */
async function stateOf(browser: Browser, viewer: Viewer): Promise<State | undefined> {
  if (viewer === 'visitor') return undefined
  const context = await browser.newContext({ baseURL: values.url })
  try {
    await signIn(await context.newPage(), demoPerson(people, viewer))
    return await context.storageState()
  } finally {
    await context.close()
  }
}

async function take(page: Page, picture: PictureOf, file: string): Promise<void> {
  await page.goto(picture.path, { waitUntil: 'networkidle' })
  for (const target of picture.click ?? []) {
    await page.locator(target).click()
    await page.waitForLoadState('networkidle')
  }
  if (picture.until) await page.locator(picture.until).first().waitFor()
  await page.evaluate(() => document.fonts.ready)
  await page.screenshot({ path: file, fullPage: true, animations: 'disabled', caret: 'hide' })
}

async function takeAll(browser: Browser, viewer: Viewer): Promise<number> {
  const pictures = wanted.filter(({ as }) => as.includes(viewer))
  if (pictures.length === 0) return 0
  const storageState = await stateOf(browser, viewer)
  for (const width of WIDTHS)
    for (const colorScheme of THEMES) {
      const context = await browser.newContext({
        baseURL: values.url,
        colorScheme,
        locale: 'en-GB',
        timezoneId: 'Europe/London',
        reducedMotion: 'reduce',
        viewport: { width, height: width > 1000 ? 900 : 844 },
        ...(storageState && { storageState }),
      })
      const page = await context.newPage()
      for (const picture of pictures) {
        const name = `${picture.name}-${viewer}-${width}-${colorScheme}`
        page.removeAllListeners()
        page.on('pageerror', (error) => problems.push(`${name}: ${error.message}`))
        page.on('console', (said) => said.type() === 'error' && problems.push(`${name}: ${said.text()}`))
        await take(page, picture, join(values.into, `${name}.png`)).catch((error: Error) =>
          problems.push(`${name}: ${error.message.split('\n')[0]}`),
        )
      }
      await context.close()
    }
  return pictures.length * WIDTHS.length * THEMES.length
}

if (!values.only) rmSync(values.into, { recursive: true, force: true })
mkdirSync(values.into, { recursive: true })
const browser = await chromium.launch(CHROMIUM)
const viewers = [...new Set(wanted.flatMap(({ as }) => as))]
let taken = 0
for (const viewer of viewers) taken += await takeAll(browser, viewer)
await browser.close()

process.stdout.write(`${taken} pictures in ${values.into}\n`)
// a page that is meant to be missing says so in the console too
const real = problems.filter((problem) => !/^not-found.*404/.test(problem))
for (const problem of real) process.stdout.write(`problem: ${problem}\n`)
process.exitCode = real.length > 0 ? 1 : 0
