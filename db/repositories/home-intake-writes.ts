/** Writes what an import decided, many homes a statement. */
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { CLASSIFICATION_CODES } from '@/lib/homes/classification-code'
import { type MergePlan } from '@/lib/imports/merge-draft'
import { now } from '@/lib/platform/clock'
import { newId } from '@/lib/platform/new-id'
import { type WritingScope } from '@/db/connection'
import { insertRows, type Value } from './insert-rows'

/** A plan whose home has its identifier, and whose patch and block have theirs. */
export type PlacedPlan = {
  readonly homeId: string
  readonly patchId: string | null
  readonly blockId: string | null
  readonly plan: MergePlan
}

/** Who wrote it, when it held, and where it came from: "stock-list.xlsx". */
export type Provenance = {
  readonly actorId: string | null
  readonly asOf: CalendarDay
  readonly source: string
}

const HOME_COLUMNS = [
  'organisation_id',
  'id',
  'kind',
  'reference',
  'uprn',
  'address',
  'town',
  'postcode',
  'address_key',
  'nation',
  'tenure',
  'patch_id',
  'block_id',
  'latitude',
  'longitude',
  'note',
] as const

const homeValues = ({ homeId, patchId, blockId, plan: { identity } }: PlacedPlan): Value[] => [
  homeId,
  identity.kind,
  identity.reference,
  identity.uprn,
  identity.address,
  identity.town,
  identity.postcode,
  identity.addressKey,
  identity.nation,
  identity.tenure,
  patchId,
  blockId,
  identity.latitude,
  identity.longitude,
  identity.note,
]

/** Inserts the homes that are new, and rewrites the identity of those that changed. */
export async function writeHomes(scope: WritingScope, plans: readonly PlacedPlan[]): Promise<void> {
  const added = plans.filter(({ plan }) => plan.known === null)
  const changed = plans.filter(({ plan }) => plan.changes.length > 0)
  const rows = (some: readonly PlacedPlan[]) =>
    some.map((placed) => [scope.organisationId, ...homeValues(placed)])
  await insertRows(scope.db, 'homes', HOME_COLUMNS, rows(added))
  const updates = HOME_COLUMNS.slice(2).map((column) => `\`${column}\`=values(\`${column}\`)`)
  await insertRows(
    scope.db,
    'homes',
    HOME_COLUMNS,
    rows(changed),
    `on duplicate key update ${updates.join(',')}`,
  )
}

/** Adds facts, and takes the place of those they supersede; both stay. */
export async function writeFacts(
  scope: WritingScope,
  plans: readonly PlacedPlan[],
  from: Provenance,
): Promise<void> {
  const superseded = plans.flatMap(({ homeId, plan }) =>
    plan.facts.flatMap(({ supersedes }) => (supersedes === null ? [] : [[homeId, supersedes]])),
  )
  for (let at = 0; at < superseded.length; at += 1_000)
    await scope
      .db('home_facts')
      .where('organisation_id', scope.organisationId)
      .whereIn(['home_id', 'id'], superseded.slice(at, at + 1_000) as string[][])
      .update({ is_current: null })
  await insertRows(
    scope.db,
    'home_facts',
    [
      'organisation_id',
      'home_id',
      'id',
      'kind',
      'value',
      'source',
      'as_of',
      'as_of_precision',
      'note',
      'recorded_by',
    ],
    plans.flatMap(({ homeId, plan }) =>
      plan.facts.map(({ kind, value }) => [
        scope.organisationId,
        homeId,
        newId(),
        kind,
        value,
        'import',
        from.asOf,
        'day',
        `${from.source}, row ${plan.draft.row}`,
        from.actorId,
      ]),
    ),
  )
}

/** Adds inspections; one of the same day from an earlier import is withdrawn, not overwritten. */
export async function writeInspections(
  scope: WritingScope,
  plans: readonly PlacedPlan[],
  from: Provenance,
): Promise<void> {
  const withdrawn = plans.flatMap(({ homeId, plan }) =>
    plan.withdraws === null ? [] : [[homeId, plan.withdraws]],
  )
  for (let at = 0; at < withdrawn.length; at += 1_000)
    await scope
      .db('inspections')
      .where('organisation_id', scope.organisationId)
      .whereIn(['home_id', 'id'], withdrawn.slice(at, at + 1_000) as string[][])
      .update({ withdrawn_at: now() })
  await insertRows(
    scope.db,
    'inspections',
    [
      'organisation_id',
      'home_id',
      'id',
      'inspected_on',
      'inspected_precision',
      'assessment',
      'next_due_on',
      'source',
      'note',
      'recorded_by',
    ],
    plans.flatMap(({ homeId, plan: { inspection, draft } }) =>
      inspection === null
        ? []
        : [
            [
              scope.organisationId,
              homeId,
              newId(),
              inspection.inspectedOn.day,
              inspection.inspectedOn.precision,
              inspection.assessment,
              inspection.nextDueOn,
              'import',
              `${from.source}, row ${draft.row}`,
              from.actorId,
            ],
          ],
    ),
  )
}

/** Adds a defect for each that the file counts and the register lacks. */
export async function writeDefects(
  scope: WritingScope,
  plans: readonly PlacedPlan[],
  from: Provenance,
): Promise<void> {
  await insertRows(
    scope.db,
    'defects',
    [
      'organisation_id',
      'home_id',
      'id',
      'code',
      'description',
      'source',
      'raised_on',
      'raised_precision',
      'recorded_by',
    ],
    plans.flatMap(({ homeId, plan: { defects, draft } }) =>
      CLASSIFICATION_CODES.flatMap((code) =>
        Array.from({ length: defects[code] }, () => [
          scope.organisationId,
          homeId,
          newId(),
          code,
          `Counted in ${from.source}, row ${draft.row}; the file does not say what was observed`.slice(
            0,
            500,
          ),
          'import',
          draft.lastInspection?.day ?? null,
          draft.lastInspection?.precision ?? null,
          from.actorId,
        ]),
      ),
    ),
  )
}
