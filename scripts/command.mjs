/**
 * Runs one of the program's commands: `node scripts/command.mjs jobs/verify-audit.ts ...`.
 * An operator's environment names the database, and is left as it is. Without one the command is for the demo on this
 * machine: it joins the demo that runs, or brings up what lies beneath it for as long as the command takes.
 */
import { spawn } from 'node:child_process'
import { startServer } from '../db/server/start-server.mjs'
import { running } from './family.mjs'
import { settingsFor } from './settings.mjs'
import { startStack } from './stack.mjs'
import { explain } from './steps.mjs'
import { stopSignal } from './stop-signal.mjs'

const signal = stopSignal()

/** The settings to run with, and what to stop afterwards. */
async function surroundings() {
  if (process.env.DATABASE_URL) return { settings: process.env, stop: async () => {} }
  const demo = running('demo')
  if (!demo?.url) return startStack({ purpose: 'demo', seed: true, web: 'none', signal })
  const server = await startServer({ purpose: 'demo' })
  return { settings: settingsFor({ urls: server.urls, url: demo.url, ports: demo.ports }), stop: server.stop }
}

/** Runs it where it can be talked to, and in the folder that it was called from, so that its paths mean what they say. */
function run(words, settings) {
  const child = spawn(process.execPath, ['--max-semi-space-size=16', '--import', 'tsx', ...words], {
    env: settings,
    stdio: 'inherit',
  })
  signal.addEventListener('abort', () => child.kill('SIGTERM'))
  return new Promise((resolve, reject) => {
    child.once('error', reject)
    child.once('close', (code) => resolve(code ?? 1))
  })
}

try {
  const { settings, stop } = await surroundings()
  // a command prints for its reader or for a program, so its log keeps to what went wrong
  process.exitCode = await run(process.argv.slice(2), { LOG_LEVEL: 'warn', ...settings }).finally(stop)
} catch (error) {
  explain(error)
  process.exitCode = 1
}
process.exit()
