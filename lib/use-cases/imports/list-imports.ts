import { reading } from '@/db/connection'
import * as imports from '@/db/repositories/imports'
import { type Actor } from '@/lib/access/actor'
import { demand } from '@/lib/access/can'
import { type KeptReport } from './import-report'

const MOST = 100

/** The organisation's imports, newest first. */
export async function listImports(actor: Actor) {
  demand(actor, 'imports.read')
  return (await imports.list(reading(actor), MOST)) as imports.Import<KeptReport>[]
}
