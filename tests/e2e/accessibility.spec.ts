/** No axe violation on any page, in light and dark, wide and narrow; and nothing that the content policy blocked. */
import AxeBuilder from '@axe-core/playwright'
import { expect, type Page } from '@playwright/test'
import { PAGES } from './pages'
import { contextOf, test } from './viewers'

const TAGS = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa']
const WIDTHS = [1440, 390] as const
const THEMES = ['light', 'dark'] as const

async function violationsOn(page: Page): Promise<string[]> {
  // no frames here, so the quick way of the library does; its other one opens a page of its own each time
  const { violations } = await new AxeBuilder({ page })
    .setLegacyMode(true)
    .withTags(TAGS)
    .options({ rules: { 'target-size': { enabled: true } } })
    .analyze()
  return violations.map(
    ({ id, nodes }) =>
      `${id}: ${nodes.map(({ html, any }) => `${html.slice(0, 160)} ${any[0]?.message ?? ''}`).join(' | ')}`,
  )
}

/** Waits until the page has been drawn anew. */
const drawn = (page: Page) =>
  page.evaluate(
    () => new Promise((done) => requestAnimationFrame(() => requestAnimationFrame(() => done(null)))),
  )

const sideways = (page: Page) =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth)

for (const { name, path, as, click = [], until } of PAGES)
  for (const viewer of as.slice(0, 1))
    test(`${name}, as ${viewer}`, async ({ browser }) => {
      test.setTimeout(120_000)
      const context = await contextOf(browser, viewer, {
        viewport: { width: 1440, height: 900 },
        reducedMotion: 'reduce',
      })
      const page = await context.newPage()
      const blocked: string[] = []
      page.on('console', (message) => {
        if (/content security policy/i.test(message.text())) blocked.push(message.text())
      })
      await page.goto(path)
      for (const target of click) await page.locator(target).click()
      if (until) await page.locator(until).first().waitFor()
      await page.waitForLoadState('networkidle')
      for (const width of WIDTHS) {
        await page.setViewportSize({ width, height: 900 })
        await expect
          .poll(() => sideways(page), `${name} scrolls sideways at ${width} px`)
          .toBeLessThanOrEqual(0)
        for (const colorScheme of THEMES) {
          await page.emulateMedia({ colorScheme })
          await drawn(page)
          // asked again where something is found: a page that is just changing has no title for a moment
          await expect
            .poll(() => violationsOn(page), {
              message: `${name} at ${width} px, ${colorScheme}`,
              timeout: 15_000,
            })
            .toEqual([])
        }
      }
      expect(blocked, 'blocked by the content policy').toEqual([])
      await context.close()
    })
