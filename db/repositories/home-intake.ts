/** Reads and writes of many homes at once, for imports: a few statements a thousand homes. */
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type Precision } from '@/lib/calendar/partial-date'
import { type ClassificationCode } from '@/lib/homes/classification-code'
import { type FactKind, type FactSource } from '@/lib/homes/fact'
import { type Nation } from '@/lib/homes/nation'
import { type Tenure } from '@/lib/homes/tenure'
import { type HomeKeys } from '@/lib/imports/match-drafts'
import { type KnownFact, type KnownHome, type KnownInspection } from '@/lib/imports/known-home'
import { type Scope } from '@/db/connection'

type KeyRow = { id: string; uprn: number | null; reference: string | null; address_key: string }

/** Homes that share a UPRN, a reference or an address with those asked for. */
export async function findByKeys(
  scope: Scope,
  keys: { uprns: readonly string[]; references: readonly string[]; addressKeys: readonly string[] },
): Promise<HomeKeys[]> {
  const found = new Map<string, HomeKeys>()
  const look = async (column: string, values: readonly (string | number)[]) => {
    if (values.length === 0) return
    const rows = (await scope
      .db('homes')
      .where('organisation_id', scope.organisationId)
      .whereIn(column, values)
      .select('id', 'uprn', 'reference', 'address_key')) as KeyRow[]
    for (const row of rows)
      found.set(row.id, {
        id: row.id,
        uprn: row.uprn === null ? null : String(row.uprn),
        reference: row.reference,
        addressKey: row.address_key,
      })
  }
  await look('uprn', keys.uprns.map(Number))
  await look('reference', keys.references)
  await look('address_key', keys.addressKeys)
  return [...found.values()]
}

type IdentityRow = {
  id: string
  kind: 'dwelling' | 'communal'
  reference: string | null
  uprn: number | null
  address: string
  town: string | null
  postcode: string | null
  address_key: string
  nation: Nation
  tenure: Tenure
  patch: string | null
  block: string | null
  latitude: number | null
  longitude: number | null
  note: string | null
}
type FactRow = { home_id: string; id: string; kind: FactKind; value: string | null; source: FactSource }
type InspectionRow = {
  home_id: string
  id: string
  inspected_on: CalendarDay
  inspected_precision: Precision
  assessment: KnownInspection['assessment']
  next_due_on: CalendarDay | null
  source: KnownInspection['source']
}
type DefectRow = { home_id: string; code: ClassificationCode; open: number }

/** Everything that an import needs to know of some homes. */
export async function listKnown(scope: Scope, ids: readonly string[]): Promise<Map<string, KnownHome>> {
  if (ids.length === 0) return new Map()
  const { db, organisationId: organisation_id } = scope
  const [homes, facts, inspections, defects] = [
    (await db('homes as home')
      .leftJoin('patches as patch', (on) =>
        on.on('patch.organisation_id', 'home.organisation_id').andOn('patch.id', 'home.patch_id'),
      )
      .leftJoin('blocks as block', (on) =>
        on.on('block.organisation_id', 'home.organisation_id').andOn('block.id', 'home.block_id'),
      )
      .where('home.organisation_id', organisation_id)
      .whereIn('home.id', ids)
      .select('home.*', 'patch.name as patch', 'block.name as block')) as IdentityRow[],
    (await db('home_facts')
      .where({ organisation_id, is_current: true })
      .whereIn('home_id', ids)
      .select('home_id', 'id', 'kind', 'value', 'source')) as FactRow[],
    (await db('inspections')
      .where({ organisation_id })
      .whereIn('home_id', ids)
      .whereNull('withdrawn_at')
      .select('*')) as InspectionRow[],
    (await db('defects')
      .where({ organisation_id })
      .whereIn('home_id', ids)
      .whereNull('closed_on')
      .groupBy('home_id', 'code')
      .select('home_id', 'code')
      .count('* as open')) as unknown as DefectRow[],
  ]
  const known = new Map<
    string,
    KnownHome & { facts: Map<FactKind, KnownFact>; inspections: KnownInspection[] }
  >()
  for (const row of homes)
    known.set(row.id, {
      id: row.id,
      identity: {
        kind: row.kind,
        reference: row.reference,
        uprn: row.uprn === null ? null : String(row.uprn),
        address: row.address,
        town: row.town,
        postcode: row.postcode,
        addressKey: row.address_key,
        nation: row.nation,
        tenure: row.tenure,
        patch: row.patch,
        block: row.block,
        latitude: row.latitude,
        longitude: row.longitude,
        note: row.note,
      },
      facts: new Map(),
      inspections: [],
      openDefects: { C1: 0, C2: 0, C3: 0, FI: 0 },
    })
  for (const row of facts)
    known.get(row.home_id)?.facts.set(row.kind, { id: row.id, value: row.value, source: row.source })
  for (const row of inspections)
    known.get(row.home_id)?.inspections.push({
      id: row.id,
      inspectedOn: { day: row.inspected_on, precision: row.inspected_precision },
      assessment: row.assessment,
      nextDueOn: row.next_due_on,
      source: row.source,
    })
  for (const row of defects) {
    const home = known.get(row.home_id)
    if (home) (home.openDefects as Record<ClassificationCode, number>)[row.code] = Number(row.open)
  }
  return known
}
