/** The homes that come first by one measure or another: the few that Today shows. */
import { type Reach } from '@/lib/access/reach'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type ClassificationCode } from '@/lib/homes/classification-code'
import { type Scope } from '@/db/connection'
import { withinReach } from './within-reach'

/** A home with a defect that has been open longest. */
export type OldestDefect = { readonly homeId: string; readonly raisedOn: CalendarDay | null }

const register = (scope: Scope, reach: Reach) =>
  withinReach(
    scope.db('home_register as register').where('register.organisation_id', scope.organisationId),
    reach,
    'register.patch_id',
  )

/** The homes with the highest scores; of those with open defects of a code, where one is given. */
export async function listWorst(scope: Scope, reach: Reach, limit: number, code?: 'C1'): Promise<string[]> {
  const query = register(scope, reach)
  if (code) query.where('register.open_c1', '>', 0)
  const rows = (await query
    .orderBy([
      { column: 'register.score', order: 'desc' },
      { column: 'register.home_id', order: 'asc' },
    ])
    .limit(limit)
    .select({ id: 'register.home_id' })) as { id: string }[]
  return rows.map((row) => row.id)
}

/** The homes whose open defect of a code was found longest ago; one without a date is as old as any, so it comes first. */
export async function listOldestOpen(
  scope: Scope,
  reach: Reach,
  code: ClassificationCode,
  limit: number,
): Promise<OldestDefect[]> {
  const rows = (await withinReach(
    scope
      .db('defects as defect')
      .join('home_register as register', (on) =>
        on
          .on('register.organisation_id', 'defect.organisation_id')
          .andOn('register.home_id', 'defect.home_id'),
      )
      .where({ 'defect.organisation_id': scope.organisationId, 'defect.code': code })
      .whereNull('defect.closed_on'),
    reach,
    'register.patch_id',
  )
    .groupBy('defect.home_id')
    .orderByRaw('max(defect.raised_on is null) desc, min(defect.raised_on), defect.home_id')
    .limit(limit)
    .select({ homeId: 'defect.home_id' })
    .select(
      scope.db.raw('if(max(defect.raised_on is null), null, min(defect.raised_on)) as raisedOn'),
    )) as unknown as OldestDefect[]
  return rows
}
