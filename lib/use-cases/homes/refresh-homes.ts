import { createHash } from 'node:crypto'
import { type WritingScope } from '@/db/connection'
import * as assessments from '@/db/repositories/assessments'
import * as defects from '@/db/repositories/defects'
import * as homeFacts from '@/db/repositories/home-facts'
import * as homeRegister from '@/db/repositories/home-register'
import * as homes from '@/db/repositories/homes'
import * as inspections from '@/db/repositories/inspections'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { deriveCurrent } from '@/lib/duties/derive-current'
import { sectorOf } from '@/lib/duties/sector'
import { newId } from '@/lib/platform/new-id'
import { assess } from '@/lib/risk/assess'
import { type RiskFacts } from '@/lib/risk/assessment'
import { explanationToText } from '@/lib/risk/explanation-text'
import { FIRST_METHOD } from '@/lib/risk/first-method'

/** How many homes are read and written together. */
export const HOMES_AT_ONCE = 1_000

const NONE_OPEN = { C1: 0, C2: 0, C3: 0, FI: 0 } as const

function byHome<T extends { readonly homeId: string }>(rows: readonly T[]): Map<string, T[]> {
  const grouped = new Map<string, T[]>()
  for (const row of rows) {
    const of = grouped.get(row.homeId)
    if (of) of.push(row)
    else grouped.set(row.homeId, [row])
  }
  return grouped
}

/** The same text for the same facts, and another for others: everything that the method reads, in a fixed order. */
const keyOf = ({ built, inspectedOn, open, ...facts }: RiskFacts) =>
  createHash('sha256')
    .update(
      JSON.stringify([
        facts.nation,
        [built.from, built.to, built.about],
        [facts.dwellingType, facts.boardType, facts.rcdCover, facts.wiring, facts.rewired],
        [facts.inspectionRecord, inspectedOn?.day, inspectedOn?.precision, facts.dueOn],
        [open.C1, open.C2, open.C3, open.FI],
      ]),
    )
    .digest('hex')

/** Kept to four decimals, which every reader of the database gets back exactly as they were written. */
const kept = (score: number) => Math.round(score * 10_000) / 10_000

const sameMonth = (a: CalendarDay, b: CalendarDay) => a.slice(0, 7) === b.slice(0, 7)

type Next = Omit<assessments.NewAssessment, 'id' | 'beganOn' | 'explanation'> & {
  readonly explain: () => string
}

/** Which assessments to write, and whose current ones become history before that. */
class Scoring {
  readonly written: assessments.NewAssessment[] = []
  readonly overtakenByFacts: string[] = []
  readonly overtakenByTime: string[] = []

  add({ explain, ...next }: Next, was: assessments.CurrentScore | undefined): void {
    const sameFacts = was?.factsKey === next.factsKey && was.methodVersion === next.methodVersion
    if (sameFacts && was.score === next.score) return
    if (sameFacts && sameMonth(was.beganOn, next.assessedOn)) {
      this.written.push({ ...next, explanation: explain(), id: was.id, beganOn: was.beganOn })
      return
    }
    if (was) (sameFacts ? this.overtakenByTime : this.overtakenByFacts).push(next.homeId)
    this.written.push({ ...next, explanation: explain(), id: newId(), beganOn: next.assessedOn })
  }
}

async function refreshSome(
  scope: WritingScope,
  homeIds: readonly string[],
  today: CalendarDay,
): Promise<void> {
  const some = await homes.listByIds(scope, homeIds)
  const facts = byHome(await homeFacts.listCurrent(scope, homeIds))
  const reports = byHome(await inspections.listLive(scope, homeIds))
  const open = await defects.countOpen(scope, homeIds)
  const before = new Map((await assessments.listCurrent(scope, homeIds)).map((one) => [one.homeId, one]))

  const scoring = new Scoring()
  const rows = some.map((home) => {
    const current = deriveCurrent({
      nation: home.nation,
      facts: facts.get(home.id) ?? [],
      inspections: reports.get(home.id) ?? [],
      openDefects: open.get(home.id) ?? NONE_OPEN,
      sector: sectorOf(home.tenure),
    })
    const assessment = assess(current, FIRST_METHOD, today)
    const { methodVersion } = assessment
    const [score, low, high] = [kept(assessment.score), kept(assessment.low), kept(assessment.high)]
    scoring.add(
      {
        homeId: home.id,
        methodVersion,
        factsKey: keyOf(current),
        assessedOn: today,
        score,
        low,
        high,
        explain: () => explanationToText(assessment),
      },
      before.get(home.id),
    )
    return { home, derived: { ...current, score, scoreLow: low, scoreHigh: high } }
  })

  await homeRegister.upsertMany(scope, rows)
  await assessments.supersede(scope, scoring.overtakenByFacts, { keepExplanation: true })
  await assessments.supersede(scope, scoring.overtakenByTime, { keepExplanation: false })
  await assessments.writeCurrent(scope, scoring.written)
}

/**
 * Derives the register's rows of some homes anew from what is on record of them, and scores them. Every change of
 * a home calls it in the change's own transaction. A score made of other facts, or by another method, is a new
 * assessment beside those before it; one that only time moved is brought up to date, with a new one each month.
 */
export async function refreshHomes(
  scope: WritingScope,
  homeIds: readonly string[],
  today: CalendarDay,
): Promise<void> {
  const each = [...new Set(homeIds)]
  for (let from = 0; from < each.length; from += HOMES_AT_ONCE)
    await refreshSome(scope, each.slice(from, from + HOMES_AT_ONCE), today)
}
