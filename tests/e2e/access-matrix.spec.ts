/** Walks every page and handler of the access matrix over HTTP, as everybody: signed out, each role, other patch, elsewhere. */
import { type APIRequestContext, type APIResponse, expect, request, test } from '@playwright/test'
import { aWorld, type World } from '../access/a-world'
import { EVERYBODY, type Somebody } from '../access/everybody'
import { HANDLERS, PAGES, type Row } from '../access/matrix'
import { type Outcome, outcomeOf } from '../access/outcome-of'
import { PASSWORD, withPassword } from '../builders/with-password'
import { closePool } from '@/db/knex'

test.describe.configure({ mode: 'serial' })

let world: World
const contexts = new Map<Somebody, APIRequestContext>()

/** Signs in by the library's own endpoint, and keeps the cookies. */
async function contextOf(somebody: Somebody): Promise<APIRequestContext> {
  const context = await request.newContext({ baseURL: process.env.E2E_URL })
  if (somebody === 'signed out') return context
  const actor = await withPassword(world.actors[somebody])
  const { csrfToken } = (await (await context.get('/api/auth/csrf')).json()) as { csrfToken: string }
  const form = { csrfToken, email: actor.email, password: PASSWORD, json: 'true' }
  const answered = await context.post('/api/auth/callback/credentials', { form, maxRedirects: 0 })
  expect(answered.status(), `${somebody} signs in`).toBe(200)
  return context
}

test.beforeAll(async () => {
  world = await aWorld()
  for (const somebody of EVERYBODY) contexts.set(somebody, await contextOf(somebody))
})
test.afterAll(async () => {
  for (const context of contexts.values()) await context.dispose()
  await closePool()
})

const IN_PATHS = { homeId: 'homeId', importId: 'importId', personId: 'personId', token: 'token' } as const

/** The address of a file under app/, with the things of the world in it. */
function pathOf(file: string, row: Row): string {
  const path = file
    .replace(/^app/, '')
    .replace(/\/(page|route)\.tsx?$/, '')
    .replace(/\/\([^)]+\)/g, '')
    .replace('[...nextauth]', 'csrf')
    .replace(/\[(\w+)\]/g, (_, name: keyof typeof IN_PATHS) => {
      if (!(name in IN_PATHS)) throw new Error(`a-world.ts has nothing for [${name}]`)
      return world[IN_PATHS[name]]
    })
  return `${path || '/'}${row.query ?? ''}`
}

/** A page sends to the sign-in page, or to where a role begins; "not found" is both its refusal and its silence. */
async function pageOutcome(response: APIResponse): Promise<Outcome | string> {
  const status = response.status()
  const to = response.headers().location ?? ''
  if (status === 307 && /\/sign-in(\?|$)/.test(to)) return 'asked to sign in'
  if (status === 404) return 'not found'
  return status === 200 || status === 307 ? 'let in' : `answered ${status}`
}

/** A handler that finds the input wrong has let its caller in. */
function handlerOutcome(response: APIResponse): Outcome | string {
  const status = response.status()
  const known: Record<number, Outcome> = { 401: 'asked to sign in', 403: 'refused', 404: 'hidden' }
  return known[status] ?? (status < 500 ? 'let in' : `answered ${status}`)
}

for (const [file, row] of Object.entries(PAGES))
  test(`page ${file}`, async () => {
    for (const somebody of EVERYBODY) {
      const response = await contexts.get(somebody)!.get(pathOf(file, row), { maxRedirects: 0 })
      const expected = outcomeOf(row, somebody)
      const said = expected === 'hidden' || expected === 'refused' ? 'not found' : expected
      expect(await pageOutcome(response), somebody).toBe(said)
      if (said !== 'not found') continue
      const text = await response.text()
      expect(text, `${somebody} must not see whose it is`).not.toContain(world.actors.auditor.email)
      expect(text).not.toContain('Lantern Row')
    }
  })

for (const [entry, row] of Object.entries(HANDLERS))
  test(`handler ${entry}`, async () => {
    const [method = 'GET', file = ''] = entry.split(' ')
    for (const somebody of EVERYBODY) {
      const response = await contexts.get(somebody)!.fetch(pathOf(file, row), { method, maxRedirects: 0 })
      expect(handlerOutcome(response), somebody).toBe(outcomeOf(row, somebody))
      if (!file.startsWith('app/api/v1')) continue
      expect(response.headers()['cache-control'], `${somebody}: no cache may keep it`).toContain('no-store')
    }
  })

test('pages carry a policy with a nonce of their own, the API does not', async () => {
  const visitor = contexts.get('signed out')!
  const policies = await Promise.all(
    [1, 2].map(async () => (await visitor.get('/sign-in')).headers()['content-security-policy']),
  )
  expect(policies[0]).toMatch(/script-src 'self' 'nonce-[\w+/=]{24}' 'strict-dynamic'/)
  expect(policies[0]).not.toBe(policies[1])
  expect((await visitor.get('/api/health')).headers()['content-security-policy']).toBeUndefined()
})
