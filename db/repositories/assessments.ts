/**
 * Scores of homes with their explanations: the current one, and those before it. A row holds for as long as the
 * facts and the method do; what only time moves is brought up to date in it, and once a month in a row of its own.
 */
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type Scope, type WritingScope } from '@/db/connection'
import { insertRows, type Value } from './insert-rows'

export type NewAssessment = {
  readonly id: string
  readonly homeId: string
  readonly methodVersion: string
  /** SHA-256 of the facts that the score was made from [hex] */
  readonly factsKey: string
  readonly beganOn: CalendarDay
  readonly assessedOn: CalendarDay
  readonly score: number
  readonly low: number
  readonly high: number
  /** by lib/risk/explanation-text */
  readonly explanation: string
}

/** Enough to tell whether a new assessment says anything new. */
export type CurrentScore = Pick<
  NewAssessment,
  'homeId' | 'id' | 'methodVersion' | 'factsKey' | 'beganOn' | 'score'
>

/** The current scores of some homes, in no order. */
export async function listCurrent(scope: Scope, homeIds: readonly string[]): Promise<CurrentScore[]> {
  if (homeIds.length === 0) return []
  return (await scope
    .db('assessments')
    .where({ organisation_id: scope.organisationId, is_current: true })
    .whereIn('home_id', [...homeIds])
    .select({
      homeId: 'home_id',
      id: 'id',
      methodVersion: 'method_version',
      factsKey: 'facts_key',
      beganOn: 'began_on',
      score: 'score',
    })) as unknown as CurrentScore[]
}

/** An assessment as it is kept; the explanation only of the current one. */
export type AssessmentOnRecord = {
  readonly methodVersion: string
  readonly beganOn: CalendarDay
  readonly assessedOn: CalendarDay
  readonly score: number
  readonly low: number
  readonly high: number
  readonly explanation: string | null
}

/** The assessments of one home, the current one first, then the newest. */
export async function listForHome(
  scope: Scope,
  homeId: string,
  limit: number,
): Promise<AssessmentOnRecord[]> {
  return (await scope
    .db('assessments')
    .where({ organisation_id: scope.organisationId, home_id: homeId })
    .orderByRaw('is_current is null, began_on desc, recorded_at desc, id desc')
    .limit(limit)
    .select({
      methodVersion: 'method_version',
      beganOn: 'began_on',
      assessedOn: 'assessed_on',
      score: 'score',
      low: 'score_low',
      high: 'score_high',
    })
    .select(
      scope.db.raw('if(is_current, explanation, null) as explanation'),
    )) as unknown as AssessmentOnRecord[]
}

const COLUMNS = [
  'organisation_id',
  'home_id',
  'id',
  'method_version',
  'facts_key',
  'began_on',
  'assessed_on',
  'score',
  'score_low',
  'score_high',
  'explanation',
] as const
const BRING_UP_TO_DATE = `on duplicate key update ${COLUMNS.slice(6)
  .map((column) => `\`${column}\`=values(\`${column}\`)`)
  .join(',')}`

/** Adds assessments as the current ones of their homes; a row with the id of a current one is brought up to date. */
export async function writeCurrent(
  scope: WritingScope,
  assessments: readonly NewAssessment[],
): Promise<void> {
  const rows = assessments.map((one): Value[] => [
    scope.organisationId,
    one.homeId,
    one.id,
    one.methodVersion,
    one.factsKey,
    one.beganOn,
    one.assessedOn,
    one.score,
    one.low,
    one.high,
    one.explanation,
  ])
  await insertRows(scope.db, 'assessments', COLUMNS, rows, BRING_UP_TO_DATE)
}

/** Makes the current assessments of some homes history; where only time moved on, without their explanation. */
export async function supersede(
  scope: WritingScope,
  homeIds: readonly string[],
  { keepExplanation }: { keepExplanation: boolean },
): Promise<void> {
  if (homeIds.length === 0) return
  await scope
    .db('assessments')
    .where({ organisation_id: scope.organisationId, is_current: true })
    .whereIn('home_id', [...homeIds])
    .update({ is_current: null, ...(!keepExplanation && { explanation: '' }) })
}
