/** Signed-in browser contexts, one a viewer, made once and used by every test of a worker. */
import { mkdirSync } from 'node:fs'
import { join, resolve } from 'node:path'
import { type Browser, type BrowserContext, test as base } from '@playwright/test'
import { type Viewer } from './pages'
import { demoPerson, demoSignIns, signIn } from './sign-in'

const KEPT = resolve(import.meta.dirname, '../../.data')
const STATES = join(KEPT, 'browser-states')

/** Where the stack of the browser tests is. */
export const baseURL = (): string => {
  const url = process.env.E2E_URL
  if (!url) throw new Error('E2E_URL is not set: the global set-up has not run')
  return url
}

/** The demo's people on the stack of the browser tests. */
export const people = () => demoSignIns(process.env.DEMO_SIGN_INS ?? join(KEPT, 'demo-sign-ins.json'))

const states = new Map<Viewer, Promise<string>>()

async function stateOf(browser: Browser, viewer: Exclude<Viewer, 'visitor'>): Promise<string> {
  mkdirSync(STATES, { recursive: true })
  const file = join(STATES, `${process.pid}-${viewer}.json`)
  const context = await browser.newContext({ baseURL: baseURL() })
  await signIn(await context.newPage(), demoPerson(people(), viewer))
  await context.storageState({ path: file })
  await context.close()
  return file
}

/** A context of a viewer: signed in once a worker, its cookie used again. */
export async function contextOf(
  browser: Browser,
  viewer: Viewer,
  options: Parameters<Browser['newContext']>[0] = {},
): Promise<BrowserContext> {
  if (viewer === 'visitor') return browser.newContext({ baseURL: baseURL(), ...options })
  if (!states.has(viewer)) states.set(viewer, stateOf(browser, viewer))
  return browser.newContext({ baseURL: baseURL(), storageState: await states.get(viewer), ...options })
}

/** A test whose pages know where the stack is. */
export const test = base.extend({
  baseURL: async ({}, use) => use(baseURL()),
})
