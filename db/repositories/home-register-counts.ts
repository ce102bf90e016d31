/** Counts over the register: by patch, by standing, by day due. Each is one statement over what a filter lets through. */
import { type Reach } from '@/lib/access/reach'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type Standing } from '@/lib/homes/standing'
import { OUT_OF_SCOPE } from '@/lib/homes/tenure'
import { addDays } from '@/lib/calendar/add-days'
import { type Scope } from '@/db/connection'
import { filtered, type HomeFilter } from './home-register-filter'
import { withinReach } from './within-reach'

const register = (scope: Scope, reach: Reach) =>
  withinReach(
    scope.db('home_register as register').where('register.organisation_id', scope.organisationId),
    reach,
    'register.patch_id',
  )

const HAS_REWIREABLE_WAYS = "register.board_type in ('rewireable', 'mixed')"
/** The landlord owes the inspection: see isInScope in lib/homes/tenure. */
const OWED = `register.tenure not in (${OUT_OF_SCOPE.map((tenure) => `'${tenure}'`).join(', ')})`
const BOARD_UNKNOWN = "register.board_type = 'unknown'"

/** Counts come back as numbers, sums as numbers or null where there was no row. */
const numbers = <T extends Record<string, unknown>>(row: T): { [K in keyof T]: number } =>
  Object.fromEntries(Object.entries(row).map(([key, value]) => [key, Number(value ?? 0)])) as {
    [K in keyof T]: number
  }

/** How many homes there are within reach. */
export async function count(scope: Scope, reach: Reach): Promise<number> {
  const row = (await register(scope, reach).count({ homes: '*' }).first()) as { homes: number }
  return Number(row.homes)
}

/** Of the homes that a filter lets through, its boards left aside: how many have rewireable ways, and how many may. */
export async function countRewireable(
  scope: Scope,
  filter: HomeFilter,
): Promise<{ rewireable: number; unknownBoard: number }> {
  const row = (await filtered(scope, filter, { board: true })
    .select(scope.db.raw(`sum(${HAS_REWIREABLE_WAYS}) as rewireable, sum(${BOARD_UNKNOWN}) as unknownBoard`))
    .first()) as { rewireable: number | null; unknownBoard: number | null }
  return numbers(row)
}

export type PatchCount = {
  /** null: homes in no patch */
  readonly patch: { readonly id: string; readonly name: string } | null
  readonly homes: number
  readonly withRewireableWays: number
  readonly unknown: number
}

/** Homes by patch, with how many have rewireable ways and how many have a board that is not known; by name. */
export async function countByPatch(scope: Scope, reach: Reach): Promise<PatchCount[]> {
  const counted = register(scope, reach)
    .groupBy('register.patch_id')
    .select('register.patch_id')
    .select(
      scope.db.raw(
        `count(*) as homes, sum(${HAS_REWIREABLE_WAYS}) as withRewireableWays, sum(${BOARD_UNKNOWN}) as unknown_board`,
      ),
    )
    .as('counted')
  const rows = (await scope.db
    .from(counted)
    .leftJoin('patches as patch', (on) =>
      on.on('patch.id', 'counted.patch_id').andOnVal('patch.organisation_id', scope.organisationId),
    )
    .orderByRaw('patch.name is null, patch.name')
    .select('counted.*', 'patch.name')) as {
    patch_id: string | null
    name: string | null
    homes: number
    withRewireableWays: number
    unknown_board: number
  }[]
  return rows.map((row) => ({
    patch: row.patch_id === null ? null : { id: row.patch_id, name: row.name ?? '' },
    homes: Number(row.homes),
    withRewireableWays: Number(row.withRewireableWays),
    unknown: Number(row.unknown_board),
  }))
}

/** Blocks that have homes within reach, by name, with how many: the first so many. */
export async function countByBlock(
  scope: Scope,
  reach: Reach,
  limit: number,
): Promise<{ id: string; name: string; homes: number }[]> {
  const counted = register(scope, reach)
    .whereNotNull('register.block_id')
    .groupBy('register.block_id')
    .select('register.block_id')
    .count({ homes: '*' })
    .as('counted')
  const rows = (await scope.db
    .from(counted)
    .join('blocks as block', (on) =>
      on.on('block.id', 'counted.block_id').andOnVal('block.organisation_id', scope.organisationId),
    )
    .orderBy('block.name')
    .limit(limit)
    .select('block.id', 'block.name', 'counted.homes')) as { id: string; name: string; homes: number }[]
  return rows.map((row) => ({ ...row, homes: Number(row.homes) }))
}

/** `homes` are those that the landlord owes an inspection; `notOwed` are the rest, on long leases. */
export type StandingCounts = Readonly<Record<Standing, number>> & {
  readonly homes: number
  readonly notOwed: number
}

/** Homes with an open C1, and with an open C2. */
export type DangerCounts = { readonly withC1: number; readonly withC2: number }

/** Homes by standing on a day, by the rule of lib/duties/standing-of, and those with dangerous defects. */
export async function countByStanding(
  scope: Scope,
  reach: Reach,
  today: CalendarDay,
  noticeDays: number,
): Promise<{ standing: StandingCounts; danger: DangerCounts }> {
  const noticeEnds = addDays(today, noticeDays)
  const dated = "register.inspection_record = 'dated' and register.due_on"
  const row = (await register(scope, reach)
    .select(
      scope.db.raw(
        `count(*) as everything, sum(${OWED}) as homes,
         sum(${OWED} and register.inspection_record = 'never') as never,
         sum(${OWED} and coalesce(${dated} < ?, 0)) as lapsed,
         sum(${OWED} and coalesce(${dated} between ? and ?, 0)) as due,
         sum(${OWED} and coalesce(${dated} > ?, 0)) as in_date,
         sum(register.open_c1 > 0) as withC1, sum(register.open_c2 > 0) as withC2`,
        [today, today, noticeEnds, noticeEnds],
      ),
    )
    .first()) as Record<
    'everything' | 'homes' | 'never' | 'lapsed' | 'due' | 'in_date' | 'withC1' | 'withC2',
    number | null
  >
  const { everything, homes, never, lapsed, due, in_date, ...danger } = numbers(row)
  const standing = {
    homes,
    notOwed: everything - homes,
    'never inspected': never,
    lapsed,
    due,
    'in date': in_date,
    'unknown date': homes - never - lapsed - due - in_date,
  }
  return { standing, danger }
}

/** How many homes' reports end on each day of a span, ends included; only those that the landlord owes. */
export async function countByDueDay(
  scope: Scope,
  reach: Reach,
  from: CalendarDay,
  to: CalendarDay,
): Promise<{ day: CalendarDay; homes: number }[]> {
  const rows = (await register(scope, reach)
    .whereBetween('register.due_on', [from, to])
    .whereNotIn('register.tenure', [...OUT_OF_SCOPE])
    .groupBy('register.due_on')
    .orderBy('register.due_on')
    .select({ day: 'register.due_on' })
    .count({ homes: '*' })) as unknown as { day: CalendarDay; homes: number }[]
  return rows.map((row) => ({ day: row.day, homes: Number(row.homes) }))
}

/** A score's place among those within reach: how many are higher, and how many there are. */
export async function rankOf(
  scope: Scope,
  reach: Reach,
  score: number,
): Promise<{ higher: number; homes: number }> {
  const row = (await register(scope, reach)
    .select(scope.db.raw('count(*) as homes, sum(register.score > ?) as higher', [score]))
    .first()) as { homes: number; higher: number | null }
  return numbers(row)
}

export type NeighbourCounts = {
  readonly homes: number
  readonly withRewireableWays: number
  readonly unknown: number
  readonly lapsed: number
}

/** The other homes of a block within reach. */
export async function countNeighbours(
  scope: Scope,
  reach: Reach,
  blockId: string,
  homeId: string,
  today: CalendarDay,
): Promise<NeighbourCounts> {
  const row = (await register(scope, reach)
    .where('register.block_id', blockId)
    .andWhere('register.home_id', '<>', homeId)
    .select(
      scope.db.raw(
        `count(*) as homes, sum(${HAS_REWIREABLE_WAYS}) as withRewireableWays, sum(${BOARD_UNKNOWN}) as unknown_board,
         sum(coalesce(register.due_on < ?, 0)) as lapsed`,
        [today],
      ),
    )
    .first()) as Record<'homes' | 'withRewireableWays' | 'unknown_board' | 'lapsed', number | null>
  const { unknown_board: unknown, ...counted } = numbers(row)
  return { ...counted, unknown }
}
