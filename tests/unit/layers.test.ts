/** The lint rules that keep the layers apart are themselves kept: each row would pass unseen if its rule broke. */
import { resolve } from 'node:path'
import { ESLint } from 'eslint'
import { describe, expect, it } from 'vitest'

const root = resolve(import.meta.dirname, '../..')
const eslint = new ESLint({ cwd: root })
const SLOW = 60_000

/** The rules that a text would break as a file at that path. The file need not be there. */
async function broken(path: string, text: string): Promise<string[]> {
  const [result] = await eslint.lintText(text, { filePath: resolve(root, path) })
  const fatal = result?.messages.filter((message) => message.fatal).map((message) => message.message)
  expect(fatal, 'the text of this row is not TypeScript').toEqual([])
  return result?.messages.flatMap(({ severity, ruleId }) => (severity === 2 && ruleId ? [ruleId] : [])) ?? []
}

const using = (name: string, from: string) =>
  `import { ${name} } from '${from}'\nexport const used = ${name}\n`

const pure = 'lib/calendar/a-rule.ts'
const platform = 'lib/platform/a-setting.ts'
const gateway = 'lib/gateways/a-service.ts'
const repository = 'db/repositories/a-thing.ts'
const useCase = 'lib/use-cases/homes/do-a-thing.ts'
const component = 'components/homes/a-thing.tsx'
const page = 'app/(office)/homes/page.tsx'
const job = 'jobs/do-a-thing.ts'
const fake = 'fakes/mail/a-thing.ts'
const test = 'tests/db/a-thing.test.ts'

const NATION = '@/lib/homes/nation'
const ENV = '@/lib/platform/env'
const MAIL = '@/lib/gateways/mail'
const CONNECTION = '@/db/connection'
const USE_CASE = '@/lib/use-cases/health/check-health'
const BUTTON = '@/components/ui/button'
const SESSION = '@/app/session'
const WORKER = '@/jobs/schedule'
const FAKE = '@/fakes/mail/mailbox'

const LAYERS = 'boundaries/dependencies'

describe('an import against the direction of the layers', () => {
  it.each([
    [pure, ENV],
    [pure, MAIL],
    [pure, CONNECTION],
    [pure, USE_CASE],
    [pure, BUTTON],
    [pure, 'node:fs'],
    [pure, 'next/headers'],
    [pure, 'react'],
    [pure, 'knex'],
    [pure, 'pino'],
    [platform, CONNECTION],
    [platform, MAIL],
    [platform, 'next/headers'],
    [gateway, CONNECTION],
    [gateway, USE_CASE],
    [gateway, 'knex'],
    [gateway, 'react'],
    [repository, MAIL],
    [repository, USE_CASE],
    [repository, 'next/navigation'],
    [repository, 'react'],
    [useCase, BUTTON],
    [useCase, SESSION],
    [useCase, WORKER],
    [useCase, 'next/cache'],
    [useCase, 'react'],
    [useCase, 'react-dom/server'],
    [useCase, 'knex'],
    [component, ENV],
    [component, CONNECTION],
    [component, MAIL],
    [component, USE_CASE],
    [component, SESSION],
    [component, 'knex'],
    [page, CONNECTION],
    [page, MAIL],
    [page, WORKER],
    [page, 'knex'],
    [job, CONNECTION],
    [job, MAIL],
    [job, BUTTON],
    [job, SESSION],
    [job, 'next/server'],
    [job, 'knex'],
    [fake, CONNECTION],
    [fake, NATION],
    ['app/jobs/page.tsx', CONNECTION],
    ['components/db/a-thing.tsx', CONNECTION],
    ['lib/use-cases/jobs/a-job.ts', WORKER],
  ])('%s may not import %s', { timeout: SLOW }, async (path, from) => {
    expect(await broken(path, using('something', from))).toContain(LAYERS)
  })
})

describe('an import along the direction of the layers', () => {
  it.each([
    [pure, NATION],
    [pure, 'zod'],
    [pure, 'date-fns'],
    [platform, NATION],
    [platform, 'pino'],
    [gateway, ENV],
    [gateway, 'nodemailer'],
    [repository, NATION],
    [repository, 'knex'],
    [useCase, CONNECTION],
    [useCase, MAIL],
    [useCase, ENV],
    [useCase, NATION],
    [useCase, 'node:stream'],
    [component, NATION],
    [component, BUTTON],
    [component, 'react'],
    [page, USE_CASE],
    [page, BUTTON],
    [page, ENV],
    [page, NATION],
    [page, 'next/navigation'],
    [job, USE_CASE],
    [job, ENV],
    [job, 'node-cron'],
    [fake, 'smtp-server'],
    [test, CONNECTION],
    [test, USE_CASE],
    [test, FAKE],
    [test, 'knex'],
    [test, '@/scripts/stack.mjs'],
    ['app/jobs/page.tsx', USE_CASE],
  ])('%s may import %s', { timeout: SLOW }, async (path, from) => {
    expect(await broken(path, using('something', from))).toEqual([])
  })
})

describe('a pure subject', () => {
  it.each([
    ['the time', 'export const at = new Date()\n', 'no-restricted-syntax'],
    ['the time as a number', 'export const at = Date.now()\n', 'no-restricted-syntax'],
    ['chance', 'export const throwOf = Math.random()\n', 'no-restricted-syntax'],
    ['the network', "export const answer = fetch('https://elsewhere.example')\n", 'no-restricted-globals'],
    ['the process', 'export const where = process.cwd()\n', 'no-restricted-globals'],
    ['the browser', 'export const width = window.innerWidth\n', 'no-restricted-globals'],
  ])('may not ask for %s', { timeout: SLOW }, async (_, text, rule) => {
    expect(await broken(pure, text)).toContain(rule)
  })

  it('may make a date of what it is given', { timeout: SLOW }, async () => {
    expect(await broken(pure, 'export const day = (text: string) => new Date(text)\n')).toEqual([])
  })

  it('does not lie loose in lib', { timeout: SLOW }, async () => {
    expect(await broken('lib/loose.ts', 'export const loose = 1\n')).toContain('boundaries/no-unknown-files')
  })
})

describe('settings', () => {
  const reads = 'export const key = process.env.SOME_KEY\n'

  it.each([[page], [component], [repository], [job], [useCase], [gateway], ['lib/platform/log.ts']])(
    'are not read from the process in %s',
    { timeout: SLOW },
    async (path) => {
      expect(await broken(path, reads)).toContain('no-restricted-properties')
    },
  )

  it('are read in the one place for them', { timeout: SLOW }, async () => {
    expect(await broken('lib/platform/env.ts', reads)).toEqual([])
  })
})

describe('a client component', () => {
  const client = "'use client'\nexport const Thing = () => <p>Here</p>\n"

  it('does not live in app', { timeout: SLOW }, async () => {
    expect(await broken('app/(office)/homes/thing.tsx', client)).toContain('no-restricted-syntax')
  })

  it('lives in components, and an error page may be one', { timeout: SLOW }, async () => {
    expect(await broken(component, client)).toEqual([])
    expect(await broken('app/(office)/error.tsx', client)).toEqual([])
  })
})

describe('a file', () => {
  const lines = (count: number) =>
    Array.from({ length: count }, (_, n) => `export const line${n} = ${n}\n`).join('')

  it('has 250 lines at most', { timeout: SLOW }, async () => {
    expect(await broken(pure, lines(250))).toEqual([])
    expect(await broken(pure, lines(251))).toContain('max-lines')
  })

  it.each([
    [pure, './utils'],
    [useCase, '@/lib/homes/helpers'],
    [page, '@/components/homes/common'],
    [repository, './index'],
    [test, './misc'],
  ])('%s may not import %s, a name that says nothing', { timeout: SLOW }, async (path, from) => {
    expect(await broken(path, using('something', from))).toContain('no-restricted-syntax')
  })

  it('holds no any, and prints nothing', { timeout: SLOW }, async () => {
    expect(await broken(useCase, 'export const loose = (given: any) => given\n')).toContain(
      '@typescript-eslint/no-explicit-any',
    )
    expect(await broken(useCase, "console.log('here')\nexport const done = 1\n")).toContain('no-console')
  })
})
