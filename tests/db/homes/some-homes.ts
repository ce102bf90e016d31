/** Homes with facts of every kind and with gaps in each, for tests that ask the register many questions. */
import { reading } from '@/db/connection'
import { pool } from '@/db/knex'
import * as homeList from '@/db/repositories/home-list'
import { homeQueryOf } from '@/lib/homes/home-query'
import { type HomeRow } from '@/lib/homes/home-row'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { filterFor, standingOn } from '@/lib/use-cases/homes/filter-for'
import { rescoreOrganisation } from '@/lib/use-cases/homes/rescore-organisation'
import { loadHomes } from '@/tests/bench/load-homes'
import { anOrganisation, type AnOrganisation } from '@/tests/builders/an-organisation'

export const TODAY = calendarDay('2026-12-01')
/** the default of the organisations table */
export const NOTICE_DAYS = 90

/** An organisation with `n` homes; scores are made coarse, so that many homes tie, and some homes get an odd address. */
export async function someHomes(n: number, seed = 1): Promise<AnOrganisation> {
  const organisation = await anOrganisation()
  await loadHomes(organisation, n, { seed, today: TODAY })
  await rescoreOrganisation(organisation, TODAY)
  const { organisationId: organisation_id } = organisation
  await pool()('home_register')
    .where({ organisation_id })
    .update({ score: pool().raw('round(score / 200) * 200') })
  const ids = (await pool()('homes').where({ organisation_id }).orderBy('uprn').pluck('id')) as string[]
  for (const [at, patch] of [organisation.patches.north, organisation.patches.south].entries()) {
    const some = ids.filter((_, i) => i % 5 === at)
    await pool()('homes').where({ organisation_id }).whereIn('id', some).update({ patch_id: patch })
    await pool()('home_register')
      .where({ organisation_id })
      .whereIn('home_id', some)
      .update({ patch_id: patch })
  }
  return organisation
}

/** Every home of the organisation, in no order, read without any filter. */
export async function everyHome({ manager }: AnOrganisation): Promise<HomeRow[]> {
  const scope = reading(manager)
  const filter = filterFor(manager, homeQueryOf({}), TODAY, NOTICE_DAYS)
  const places = await homeList.listPlaces(scope, filter, { sort: 'score', order: 'desc' }, null, 100_000)
  const homes = await homeList.listByIds(
    scope,
    'all',
    places.map((place) => place.id),
  )
  return homes.map(standingOn(TODAY, NOTICE_DAYS))
}
