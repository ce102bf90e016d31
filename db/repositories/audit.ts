/** The audit trail: append-only, hash-chained per organisation, written in the transaction of the change. */
import { canonicalJson, CHAIN_START, chainHash } from '@/lib/platform/hash-chain'
import { now } from '@/lib/platform/clock'
import { type DeploymentScope, type Scope, type WritingScope } from '@/db/connection'

export type AuditRecord = {
  /** null: the program itself */
  actorId: string | null
  /** subject and past tense: `home.fact-recorded` */
  did: string
  subjectKind: string
  subjectId: string
  /** what changed, without personal data */
  detail?: Record<string, unknown>
}

export type AuditEntry = {
  sequence: number
  at: string
  actorId: string | null
  actorName: string | null
  did: string
  subjectKind: string
  subjectId: string
  detail: Record<string, unknown>
  hash: string
}

type Head = { sequence: number; hash: string }

/** Appends an entry. The head row is locked, so entries of one organisation are written one after another. */
export async function record(scope: WritingScope, entry: AuditRecord): Promise<void> {
  const organisation_id = scope.organisationId
  const head =
    ((await scope.db('audit_heads').where({ organisation_id }).forUpdate().first('sequence', 'hash')) as
      Head | undefined) ?? (await begin(scope))
  const at = now()
  const chained = {
    organisationId: organisation_id,
    sequence: Number(head.sequence) + 1,
    at: at.toISOString(),
    actorId: entry.actorId,
    did: entry.did,
    subjectKind: entry.subjectKind,
    subjectId: entry.subjectId,
    detail: canonicalJson(entry.detail ?? {}),
  }
  const hash = chainHash(head.hash, chained)
  await scope.db('audit_entries').insert({
    organisation_id,
    sequence: chained.sequence,
    at,
    actor_id: chained.actorId,
    did: chained.did,
    subject_kind: chained.subjectKind,
    subject_id: chained.subjectId,
    detail: chained.detail,
    previous_hash: head.hash,
    hash,
  })
  await scope.db('audit_heads').where({ organisation_id }).update({ sequence: chained.sequence, hash })
}

async function begin(scope: WritingScope): Promise<Head> {
  const start = { sequence: 0, hash: CHAIN_START }
  await scope.db('audit_heads').insert({ organisation_id: scope.organisationId, ...start })
  return start
}

type Row = {
  sequence: number
  at: Date
  actor_id: string | null
  actor_name: string | null
  did: string
  subject_kind: string
  subject_id: string
  detail: string
  previous_hash: string
  hash: string
}

const toEntry = (row: Row): AuditEntry => ({
  sequence: Number(row.sequence),
  at: row.at.toISOString(),
  actorId: row.actor_id,
  actorName: row.actor_name,
  did: row.did,
  subjectKind: row.subject_kind,
  subjectId: row.subject_id,
  detail: JSON.parse(row.detail) as Record<string, unknown>,
  hash: row.hash,
})

/** Entries, newest first, before a sequence number; of one subject where that is given. */
export async function list(
  scope: Scope,
  { before, subjectId, limit }: { before?: number; subjectId?: string; limit: number },
): Promise<AuditEntry[]> {
  const query = scope
    .db('audit_entries as entry')
    .leftJoin('people as person', 'person.id', 'entry.actor_id')
    .where('entry.organisation_id', scope.organisationId)
    .orderBy('entry.sequence', 'desc')
    .limit(limit)
    .select('entry.*', 'person.name as actor_name')
  if (before !== undefined) query.where('entry.sequence', '<', before)
  if (subjectId !== undefined) query.where('entry.subject_id', subjectId)
  return ((await query) as Row[]).map(toEntry)
}

/** How many entries an organisation has. */
export async function count(scope: Scope): Promise<number> {
  const row = await scope.db('audit_heads').where({ organisation_id: scope.organisationId }).first('sequence')
  return Number((row as { sequence: number } | undefined)?.sequence ?? 0)
}

export type ChainBreak = { organisationId: string; sequence: number; why: string }

/** Walks one organisation's chain from the start; the first break, or null, and how many entries were right. */
export async function verify(scope: Scope): Promise<{ entries: number; broken: ChainBreak | null }> {
  const organisationId = scope.organisationId
  let previous = CHAIN_START
  let entries = 0
  const broken = (sequence: number, why: string) => ({ entries, broken: { organisationId, sequence, why } })
  for (;;) {
    const rows = (await scope
      .db('audit_entries')
      .where({ organisation_id: organisationId })
      .andWhere('sequence', '>', entries)
      .orderBy('sequence')
      .limit(5_000)) as Row[]
    for (const row of rows) {
      const sequence = Number(row.sequence)
      if (sequence !== entries + 1) return broken(entries + 1, 'an entry is missing')
      if (row.previous_hash !== previous)
        return broken(sequence, 'it does not follow from the entry before it')
      const chained = {
        organisationId,
        sequence,
        at: row.at.toISOString(),
        actorId: row.actor_id,
        did: row.did,
        subjectKind: row.subject_kind,
        subjectId: row.subject_id,
        detail: row.detail,
      }
      if (chainHash(previous, chained) !== row.hash) return broken(sequence, 'its content was changed')
      previous = row.hash
      entries += 1
    }
    if (rows.length < 5_000) break
  }
  const head = (await scope.db('audit_heads').where({ organisation_id: organisationId }).first()) as
    Head | undefined
  if (head && Number(head.sequence) !== entries) return broken(entries + 1, 'the last entries are missing')
  if (head && head.hash !== previous) return broken(entries, 'the head does not match the last entry')
  return { entries, broken: null }
}

/** Every organisation that has a chain. */
export async function chainedOrganisations(scope: DeploymentScope): Promise<string[]> {
  const rows = (await scope.db('organisations').orderBy('id').select('id')) as { id: string }[]
  return rows.map((row) => row.id)
}
