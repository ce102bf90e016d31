/**
 * Before the browser tests: a stack of their own, never the demo's.
 * `npm test` has one up already and says where; a run by hand starts one here, and stops it at its end.
 */
import { startStack } from '@/scripts/stack.mjs'
import { TODAY } from './chromium'

export default async function globalSetup(): Promise<(() => Promise<void>) | undefined> {
  if (process.env.E2E_URL) return undefined
  const stack = await startStack({ purpose: 'e2e', today: TODAY, seed: true, fresh: true })
  Object.assign(process.env, stack.settings, { E2E_URL: stack.url, E2E_INBOX: stack.inbox })
  return () => stack.stop()
}
