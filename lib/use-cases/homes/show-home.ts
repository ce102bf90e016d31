import { z } from 'zod'
import { reading } from '@/db/connection'
import * as assessments from '@/db/repositories/assessments'
import * as defects from '@/db/repositories/defects'
import * as homeFacts from '@/db/repositories/home-facts'
import * as homeList from '@/db/repositories/home-list'
import * as counts from '@/db/repositories/home-register-counts'
import * as homes from '@/db/repositories/homes'
import * as inspections from '@/db/repositories/inspections'
import * as organisations from '@/db/repositories/organisations'
import { type Actor } from '@/lib/access/actor'
import { can, demand } from '@/lib/access/can'
import { reachOf } from '@/lib/access/reach'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { deriveCurrent } from '@/lib/duties/derive-current'
import { type IntervalRule, intervalRule, ruleCitation } from '@/lib/duties/interval-rules'
import { sectorOf } from '@/lib/duties/sector'
import { standingReason } from '@/lib/duties/standing-in-words'
import { NotFound } from '@/lib/errors/expected'
import { FACT_KINDS, type FactKind } from '@/lib/homes/fact'
import { type HomeRow } from '@/lib/homes/home-row'
import { isInScope } from '@/lib/homes/tenure'
import { type Assessment } from '@/lib/risk/assessment'
import { explanationFromText } from '@/lib/risk/explanation-text'
import { standingOn } from './filter-for'

export type FactHistory = {
  readonly kind: FactKind
  readonly current: homeFacts.FactOnRecord | null
  /** those that it superseded, the newest first */
  readonly before: readonly homeFacts.FactOnRecord[]
}

export type HomeOnRecord = {
  readonly home: HomeRow
  readonly note: string | null
  readonly standing: {
    /** one sentence that names the law */
    readonly reason: string
    readonly rule: IntervalRule
    /** the rule's instrument and clause: 'SI 2020/312, reg 3(2)' */
    readonly citation: string
    readonly decidedBy: 'law' | 'report' | null
    /** false where the tenure takes the home out of the landlord's duty */
    readonly isOwed: boolean
  }
  /** one entry a kind, known or not, in the order of the kinds */
  readonly facts: readonly FactHistory[]
  readonly inspections: readonly inspections.InspectionOnRecord[]
  readonly openDefects: readonly defects.DefectOnRecord[]
  readonly closedDefects: readonly defects.DefectOnRecord[]
  readonly assessment: Assessment | null
  /** its place by score among the homes that the actor sees: 1 is the highest */
  readonly rank: { readonly place: number; readonly of: number }
  /** the oldest first */
  readonly scoreHistory: readonly {
    readonly on: CalendarDay
    readonly score: number
    readonly low: number
    readonly high: number
    readonly methodVersion: string
  }[]
  /** the other homes of its block within reach; null where it is in none */
  readonly neighbours: counts.NeighbourCounts | null
  readonly mayEdit: boolean
}

/** How many scores of a home are shown at most: five years of months, and the changes between. */
const MOST_SCORES = 120

/**
 * Everything that a home's page shows. Nine statements at most.
 * @throws NotFound where there is no such home within the actor's reach, NotAllowed
 */
export async function showHome(actor: Actor, homeId: string, today: CalendarDay): Promise<HomeOnRecord> {
  demand(actor, 'homes.read')
  if (!z.uuid().safeParse(homeId).success) throw new NotFound('That home')
  const scope = reading(actor)
  const reach = reachOf(actor)
  const [{ noticeDays }, [registered], kept] = await Promise.all([
    organisations.get(scope),
    homeList.listByIds(scope, reach, [homeId]),
    homes.getById(scope, reach, homeId),
  ])
  if (!registered) throw new NotFound('That home')
  const [facts, reports, found, scores, rank, neighbours] = await Promise.all([
    homeFacts.listForHome(scope, homeId),
    inspections.listForHome(scope, homeId),
    defects.listForHome(scope, homeId),
    assessments.listForHome(scope, homeId, MOST_SCORES),
    counts.rankOf(scope, reach, registered.score),
    registered.block ? counts.countNeighbours(scope, reach, registered.block.id, homeId, today) : null,
  ])
  const home = standingOn(today, noticeDays)(registered)
  const sector = sectorOf(home.tenure)
  const rule = intervalRule(home.nation, sector)
  const { decidedBy } = deriveCurrent({
    nation: home.nation,
    sector,
    facts: facts.filter((fact) => fact.current),
    inspections: reports.filter((report) => report.withdrawnAt === null),
    openDefects: home.open,
  })
  const explanation = scores[0]?.explanation
  return {
    home,
    note: kept.note,
    standing: {
      reason: standingReason({ ...home, sector, ...(decidedBy && { decidedBy }) }),
      rule,
      citation: ruleCitation(rule),
      decidedBy,
      isOwed: isInScope(home.tenure),
    },
    facts: FACT_KINDS.map((kind) => ({
      kind,
      current: facts.find((fact) => fact.kind === kind && fact.current) ?? null,
      before: facts.filter((fact) => fact.kind === kind && !fact.current),
    })),
    inspections: reports,
    openDefects: found.filter((defect) => defect.closedOn === null),
    closedDefects: found.filter((defect) => defect.closedOn !== null),
    assessment: explanation ? explanationFromText(explanation) : null,
    rank: { place: rank.higher + 1, of: rank.homes },
    scoreHistory: scores
      .map(({ beganOn, score, low, high, methodVersion }) => ({
        on: beganOn,
        score,
        low,
        high,
        methodVersion,
      }))
      .reverse(),
    neighbours,
    mayEdit: can(actor, 'homes.edit'),
  }
}
