/** `npm run seed`: fills an empty demo. Never a live deployment, and never a database on another machine. */
import { mkdirSync, writeFileSync } from 'node:fs'
import { resolve } from 'node:path'
import { today } from '@/lib/platform/clock'
import { env } from '@/lib/platform/env'
import { demoSignIns, seedDemo } from '@/lib/use-cases/demo/seed-demo'
import { stopDatabase } from '@/lib/use-cases/jobs/stop-database'

const LOOPBACK = new Set(['127.0.0.1', 'localhost', '[::1]'])

function refuse(why: string): never {
  console.error(`No demo was seeded: ${why}`)
  process.exit(1)
}

const { FUSEWARD_DEPLOYMENT, DATABASE_URL } = env()
if (FUSEWARD_DEPLOYMENT !== 'demo') refuse('FUSEWARD_DEPLOYMENT is not "demo".')
const host = new URL(DATABASE_URL).hostname
if (!LOOPBACK.has(host)) refuse(`the database is on ${host}, and a demo's is on this machine (loopback).`)

const started = performance.now()
const seeded = await seedDemo(today()).finally(stopDatabase)
const seconds = ((performance.now() - started) / 1_000).toFixed(1)

const folder = resolve(import.meta.dirname, '../.data')
mkdirSync(folder, { recursive: true })
writeFileSync(resolve(folder, 'demo-sign-ins.json'), `${JSON.stringify(demoSignIns(), null, 2)}\n`, {
  mode: 0o600,
})

if (seeded.length === 0) console.log('The demo is there already; nothing was changed.')
for (const { organisation, people, homes, inspections } of seeded)
  console.log(`${organisation}: ${homes} homes, ${inspections} inspections, ${people} people`)
if (seeded.length > 0) console.log(`Seeded in ${seconds} s. Sign-ins are in .data/demo-sign-ins.json.`)
