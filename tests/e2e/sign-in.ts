/** Signing in as a person would, with the demo's own people. */
import { readFileSync } from 'node:fs'
import { type Page } from '@playwright/test'
import { type Viewer } from './pages'

export type DemoSignIn = { organisation: string; name: string; role: string; email: string; password: string }

/** The demo's people, as its seeder wrote them down. */
export const demoSignIns = (file: string): DemoSignIn[] =>
  JSON.parse(readFileSync(file, 'utf8')) as DemoSignIn[]

/**
 * Who a viewer is. The first organisation of the list is the large one; the landlord is of another.
 * @throws Error where the demo has nobody of that kind
 */
export function demoPerson(people: readonly DemoSignIn[], viewer: Exclude<Viewer, 'visitor'>): DemoSignIn {
  const large = people[0]?.organisation
  const found = people.find(({ organisation, role }) =>
    viewer === 'landlord'
      ? organisation !== large && role === 'manager'
      : organisation === large && role === viewer,
  )
  if (!found) throw new Error(`The demo has no ${viewer}`)
  return found
}

/** Fills the form in and waits until the page has changed. */
export async function signIn(page: Page, person: { email: string; password: string }): Promise<void> {
  await page.goto('/sign-in')
  await page.locator('input[name=email]').fill(person.email)
  await page.locator('input[name=password]').fill(person.password)
  await page.getByRole('button', { name: 'Sign in', exact: true }).click()
  await page.waitForURL((url) => url.pathname !== '/sign-in')
}
