/** Whether this Node is new enough: the first thing asked, before anything else can fail in an unreadable way. */
import { readFileSync } from 'node:fs'
import { Trouble } from '../db/server/trouble.mjs'

/** @throws Trouble where the running Node is older than package.json asks */
export function demandNode(running = process.versions.node) {
  const { engines } = JSON.parse(readFileSync(new URL('../package.json', import.meta.url), 'utf8'))
  const wanted = engines.node.replace(/^>=/, '')
  const numbers = (version) => version.split('.').map(Number)
  const [have, need] = [numbers(running), numbers(wanted)]
  const differs = need.findIndex((part, place) => part !== have[place])
  if (differs >= 0 && (have[differs] ?? 0) < need[differs])
    throw new Trouble(`Node ${running} is too old: this needs ${wanted} or newer.`, {
      advice: 'Install Node 20 or 22, and run this again.',
    })
  return `Node ${running}`
}
