/** `npm test`: everything there is to check, from a clone alone. Ends with one line: `N passed, N failed`. */
import { mkdirSync, rmSync } from 'node:fs'
import { join, relative } from 'node:path'
import { installIfMissing } from '../db/server/install-if-missing.mjs'
import { KEPT, ROOT } from '../db/server/purposes.mjs'
import { Trouble } from '../db/server/trouble.mjs'
import { ensureBuild } from './build-site.mjs'
import { claim } from './family.mjs'
import { demandNode } from './node-version.mjs'
import { ensurePackages } from './packages.mjs'
import { startStack } from './stack.mjs'
import { explain, step } from './steps.mjs'
import { stopSignal } from './stop-signal.mjs'
import { readPlaywright, readVitest } from './test-results.mjs'

const REPORTS = join(KEPT, 'reports')
const TODAY = '2026-12-01'
const SHOWN = 25

const signal = stopSignal()
const total = { passed: 0, failed: 0 }
const program = (path, ...words) => [process.execPath, join(ROOT, 'node_modules', path), ...words]
const clean = { ...process.env, NODE_ENV: undefined, NEXT_TELEMETRY_DISABLED: '1', NODE_NO_WARNINGS: '1' }

/** Runs one part and counts it; a part that fails stops no other. Gives back whether it went well. */
async function part(name, work) {
  if (signal.aborted) return false
  try {
    const counted = await step(name, work)
    const { passed, failed } = typeof counted === 'object' ? counted : { passed: 1, failed: 0 }
    total.passed += passed
    total.failed += failed
    return failed === 0
  } catch (error) {
    total.failed += error.failed ?? 1
    total.passed += error.passed ?? 0
    if (!signal.aborted) explain(error)
    return false
  }
}

/** Preparation: it counts only where it fails. */
async function prepare(name, work) {
  const before = total.passed
  const well = await part(name, work)
  total.passed = before
  return well
}

/** A runner's counts, as a step's words or as the trouble that its failures are. */
function judge(family, name, how, results) {
  const said = [`${results.passed} passed`, results.skipped && `${results.skipped} skipped`]
    .filter(Boolean)
    .join(', ')
  const stopped = how !== 0 && results.failed === 0
  if (how === 0 && results.failed === 0) return { ...results, said }
  const shown = results.failures.slice(0, SHOWN).map((failure) => `  - ${failure.replaceAll(`${ROOT}/`, '')}`)
  const message = [`${name}: ${said}, ${results.failed + Number(stopped)} failed`, ...shown].join('\n')
  const trouble = new Trouble(message, {
    advice: `The whole of it: ${relative(process.cwd(), family.logOf(name))}`,
  })
  throw Object.assign(trouble, { passed: results.passed, failed: results.failed + Number(stopped) })
}

async function vitest(family, project) {
  const report = join(REPORTS, `${project}.json`)
  const words = ['run', '--config', 'tests/vitest.config.ts', '--project', project]
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`]
  const how = await family.run(project, program('vitest/vitest.mjs', ...words, ...reporters), clean)
  return judge(family, project, how, readVitest(report))
}

/** The browser tests, on a stack of their own: another database, other ports, other folders than the demo's. */
async function browser(family) {
  const report = join(REPORTS, 'browser.json')
  const stack = await startStack({ purpose: 'e2e', today: TODAY, seed: true, fresh: true, signal })
  try {
    const words = ['test', '--config', 'tests/e2e/playwright.config.ts', '--reporter=list,json']
    const env = {
      ...clean,
      ...stack.settings,
      E2E_URL: stack.url,
      E2E_INBOX: stack.inbox,
      PLAYWRIGHT_JSON_OUTPUT_FILE: report,
    }
    const how = await family.run('browser', program('@playwright/test/cli.js', ...words), env)
    return judge(family, 'browser', how, readPlaywright(report))
  } finally {
    await stack.stop()
  }
}

const must = (family, name, words, env = clean) =>
  family.must(name, words, env, { message: `${name} found something.` })

async function everything(family) {
  if (!(await prepare('packages', () => ensurePackages(family)))) return
  const database = await prepare('MariaDB', () => installIfMissing())
  const chromium = await prepare('Chromium', () =>
    installIfMissing({ debianPackage: 'chromium', programs: ['chromium'] }),
  )
  await part('lint', () => must(family, 'lint', program('eslint/bin/eslint.js', '.')))
  await part('format', () =>
    must(family, 'format', program('prettier/bin/prettier.cjs', '--check', '--log-level', 'warn', '.')),
  )
  await part('types', async () => {
    await must(family, 'types', program('next/dist/bin/next', 'typegen'))
    await must(family, 'types', program('typescript/bin/tsc', '--noEmit'))
  })
  await part('unit', () => vitest(family, 'unit'))
  await part('reference', () => vitest(family, 'reference'))
  if (database) await part('db', () => vitest(family, 'db'))
  const built = await part('build', () => ensureBuild(family))
  if (built && database && chromium) await part('browser', () => browser(family))
  else if (!signal.aborted) total.failed += 1 // what could not be tried has not passed
}

try {
  demandNode()
  rmSync(REPORTS, { recursive: true, force: true })
  mkdirSync(REPORTS, { recursive: true })
  const family = await claim('checks')
  signal.addEventListener('abort', () => family.stop())
  await everything(family).finally(() => family.stop())
} catch (error) {
  explain(error)
  total.failed += 1
}
if (signal.aborted) total.failed += 1
process.stdout.write(`\n${total.passed} passed, ${total.failed} failed\n`)
process.exit(total.failed > 0 ? 1 : 0)
