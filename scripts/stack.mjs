/** A whole running Fuseward on this machine: database, fakes, worker and web, started in order and stopped in order. */
import { connect } from 'node:net'
import { existsSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import { freePort } from '../db/server/free-port.mjs'
import { installIfMissing } from '../db/server/install-if-missing.mjs'
import { pause } from '../db/server/processes.mjs'
import { KEPT, PURPOSES } from '../db/server/purposes.mjs'
import { startServer } from '../db/server/start-server.mjs'
import { Trouble } from '../db/server/trouble.mjs'
import { ensureBuild, NEXT } from './build-site.mjs'
import { claim } from './family.mjs'
import { ensurePackages } from './packages.mjs'
import { settingsFor } from './settings.mjs'
import { quietly } from './steps.mjs'
import { SIGN_INS } from './welcome.mjs'

// a larger young generation: reading thousands of rows makes much that dies at once
const TYPESCRIPT = [process.execPath, '--max-semi-space-size=16', '--import', 'tsx']
const PATIENCE = 90_000
const ON_THIS_MACHINE = ['127.0.0.1', '::1', '0.0.0.0', '::']

const listens = (port) =>
  new Promise((resolve) => {
    const socket = connect(port, '127.0.0.1', () => resolve(socket.destroy() && true))
    socket.once('error', () => resolve(false))
  })

const isHealthy = (url) =>
  fetch(`${url}/api/health`, { signal: AbortSignal.timeout(20_000) }).then(
    (answer) => answer.ok,
    () => false,
  )

/** Waits until something is so, or until a child has died, or patience ends. */
async function until(family, isSo, failure) {
  let dead = null
  family.death.then((trouble) => (dead = trouble))
  for (const end = Date.now() + PATIENCE; Date.now() < end; await pause(50)) {
    if (dead) throw dead
    if (family.stopping) throw new Trouble('Stopped before it was up.')
    if (await isSo()) return
  }
  throw failure
}

async function portsOf(purpose, { port, host }) {
  const first = PURPOSES[purpose]
  const [web, mail, inbox, files] = await Promise.all([
    freePort(port ?? first.web, { host }),
    freePort(first.mail),
    freePort(first.inbox),
    freePort(first.files),
  ])
  return { web, mail, inbox, files }
}

/** The mail server and the file storage, which keep what they have in folders of the purpose. */
async function startFakes(family, ports, folder) {
  family.start('mail', [
    ...TYPESCRIPT,
    'fakes/mail/serve.ts',
    `--smtp-port=${ports.mail}`,
    `--web-port=${ports.inbox}`,
    `--folder=${folder('mail')}`,
  ])
  family.start('files', [
    ...TYPESCRIPT,
    'fakes/files/serve.ts',
    `--port=${ports.files}`,
    `--folder=${folder('files')}`,
  ])
  const failure = (name) => new Trouble(`The fake for ${name} did not come up.`, { log: family.logOf(name) })
  for (const [name, port] of [
    ['mail', ports.inbox],
    ['mail', ports.mail],
    ['files', ports.files],
  ])
    await until(family, () => listens(port), failure(name))
  return `letters at http://127.0.0.1:${ports.inbox}`
}

async function seedWhereEmpty(family, server, settings) {
  const organisations = () => server.ask('select count(*) from organisations')
  const homes = async () =>
    `${Number(await server.ask('select count(*) from homes')).toLocaleString('en-GB')} homes`
  // the list of sign-ins is written last, so half a seeding has none, and the seeder adds only what is missing
  if ((await organisations()) !== '0' && existsSync(SIGN_INS)) return `${await homes()}, kept`
  await family.must('seed', [...TYPESCRIPT, 'jobs/seed-demo.ts'], settings, {
    message: 'The demo data could not be made.',
    advice: 'Run npm run demo:reset for a clean start.',
  })
  return `${await homes()}, new`
}

async function startWeb({ family, settings, url }, { web, host, port }) {
  family.start('worker', [...TYPESCRIPT, 'jobs/worker.ts'], settings)
  family.start('web', [process.execPath, NEXT, web, '-p', String(port), '-H', host], settings)
  await until(
    family,
    () => isHealthy(url),
    new Trouble('The site did not answer.', { log: family.logOf('web') }),
  )
  return `and worker, at ${url}`
}

/**
 * Starts a stack. What came up before a failure is stopped again.
 * @param {object} wanted
 * @param {'demo' | 'e2e' | 'shots' | 'bench'} wanted.purpose which database, folders and ports
 * @param {string} [wanted.today] the date to pin, as 2026-12-01
 * @param {boolean} [wanted.seed] put the demo in where there is no organisation
 * @param {boolean} [wanted.fresh] throw away what the purpose's database and folders hold
 * @param {'start' | 'dev' | 'none'} [wanted.web] the built site, the one that follows edits, or only what lies beneath
 * @param {AbortSignal} [wanted.signal] gives up on a start that is under way
 * @param {typeof quietly} [wanted.step] how to tell of each step
 */
export async function startStack({ signal, step = quietly, ...wanted }) {
  const family = await claim(wanted.purpose)
  const stack = { family, server: null }
  stack.stop = async () => {
    await family.stop('mail', 'files')
    await stack.server?.stop()
  }
  signal?.addEventListener('abort', () => family.stop('mail', 'files'))
  try {
    await bringUp(stack, { seed: false, fresh: false, web: 'start', host: '127.0.0.1', ...wanted }, step)
    return stack
  } catch (error) {
    await stack.stop()
    throw error
  }
}

async function bringUp(stack, { purpose, today, seed, fresh, web, host, port }, step) {
  const { family } = stack
  const folder = (name) => join(KEPT, purpose === 'demo' ? name : `${purpose}-${name}`)
  if (family.orphans > 0)
    await step('left over', () => `${family.orphans} processes of a killed start, ended`)
  await step('packages', () => ensurePackages(family))
  await step('MariaDB', () => installIfMissing())
  await step('database', async () => {
    stack.server = await startServer({ purpose })
    if (fresh) await stack.server.empty()
    return `on port ${stack.server.port}${stack.server.joined ? ', was running' : ''}`
  })
  const { server } = stack
  const ports = await portsOf(purpose, { port, host })
  stack.url = `http://${ON_THIS_MACHINE.includes(host) ? 'localhost' : host}:${ports.web}`
  stack.inbox = `http://127.0.0.1:${ports.inbox}`
  stack.settings = settingsFor({ urls: server.urls, url: stack.url, ports, today })
  if (fresh) for (const name of ['mail', 'files']) rmSync(folder(name), { recursive: true, force: true })
  const fakes = startFakes(family, ports, folder) // they come up while the schema is seen to
  fakes.catch(() => {}) // its own step, below, tells
  await step('schema', async () => {
    const failure = { message: 'The schema could not be brought up to date.' }
    await family.must('migrate', [...TYPESCRIPT, 'db/migrate.ts'], stack.settings, failure)
    return 'the newest'
  })
  await step('fakes', () => fakes)
  if (seed) await step('demo data', () => seedWhereEmpty(family, server, stack.settings))
  if (web === 'start') await step('build', () => ensureBuild(family))
  if (web !== 'none') await step('web', () => startWeb(stack, { web, host, port: ports.web }))
  family.at(stack.url, ports)
}
