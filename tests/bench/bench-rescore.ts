import { reading } from '@/db/connection'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { rescoreOrganisation } from '@/lib/use-cases/homes/rescore-organisation'
import { type Actor } from '@/lib/access/actor'
import { type Figure } from './figures'
import { once } from './measure'

const READ = ['homes', 'home_facts', 'inspections', 'defects'] as const

/** A full re-score with reading and writing, beside reading the same rows and touching the same derived rows in bare SQL. */
export async function benchRescore(actor: Actor, homes: number): Promise<Figure[]> {
  const first = await once(() => rescoreOrganisation(actor, calendarDay('2026-11-01')))
  const again = await once(() => rescoreOrganisation(actor, calendarDay('2026-12-01')))
  const { db, organisationId } = reading(actor)
  const bare = await once(async () => {
    for (const table of READ) await db(table).where('organisation_id', organisationId).select('*')
    await db('home_register')
      .where('organisation_id', organisationId)
      .update({ score: db.raw('score + 0') })
    await db('assessments')
      .where({ organisation_id: organisationId, is_current: true })
      .update({ score: db.raw('score + 0') })
  })
  const seconds = (of: { milliseconds: number }) => of.milliseconds / 1000
  return [
    { what: 'first scoring of every home', value: seconds(first), unit: 's' },
    {
      what: 'full re-score a month later',
      value: seconds(again),
      unit: 's',
      bare: seconds(bare),
      most: 60,
      mostIs: 'value',
    },
    { what: 're-scored a second', value: homes / seconds(again), unit: 'homes' },
  ]
}
