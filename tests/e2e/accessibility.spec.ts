/** No axe violation on any page, in light and dark, wide and narrow; and nothing that the content policy blocked. */
import AxeBuilder from '@axe-core/playwright'
import { expect } from '@playwright/test'
import { PAGES } from './pages'
import { contextOf, test } from './viewers'

const TAGS = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa']
const WIDTHS = [1440, 390] as const
const THEMES = ['light', 'dark'] as const

for (const { name, path, as, click = [], until } of PAGES)
  for (const viewer of as.slice(0, 1))
    test(`${name}, as ${viewer}`, async ({ browser }) => {
      for (const width of WIDTHS)
        for (const theme of THEMES) {
          const context = await contextOf(browser, viewer, {
            viewport: { width, height: 900 },
            colorScheme: theme,
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
          const { violations } = await new AxeBuilder({ page })
            .withTags(TAGS)
            .options({ rules: { 'target-size': { enabled: true } } })
            .analyze()
          const found = violations.map(
            ({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html.slice(0, 160)).join(' | ')}`,
          )
          expect(found, `${name} at ${width} px, ${theme}`).toEqual([])
          expect(blocked, 'blocked by the content policy').toEqual([])
          const overflow = await page.evaluate(
            () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
          )
          expect(overflow, `${name} scrolls sideways at ${width} px`).toBeLessThanOrEqual(0)
          await context.close()
        }
    })
