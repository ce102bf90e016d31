import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type Nation } from '@/lib/homes/nation'
import { town } from '../town/town'
import { type DemoHome } from './demo-home'
import { type DemoPerson, LANDLORD_PEOPLE, PROVIDER_PEOPLE } from './demo-people'
import { landlordHomes } from './landlord-homes'
import { providerHomes } from './provider-homes'

export type DemoOrganisation = {
  readonly slug: 'larrowside-homes' | 'tai-aberllinos'
  readonly name: string
  readonly kind: 'provider' | 'landlord'
  readonly nation: Nation
  /** the stock list that its homes are said to come from */
  readonly source: string
  readonly people: readonly DemoPerson[]
}

export const DEMO_ORGANISATIONS: readonly DemoOrganisation[] = [
  {
    slug: 'larrowside-homes',
    name: 'Larrowside Homes',
    kind: 'provider',
    nation: 'england',
    source: 'larrowside-stock.xlsx',
    people: PROVIDER_PEOPLE,
  },
  {
    slug: 'tai-aberllinos',
    name: 'Tai Aberllinos',
    kind: 'landlord',
    nation: 'wales',
    source: 'my-three-homes.csv',
    people: LANDLORD_PEOPLE,
  },
]

/**
 * The homes of every organisation of the demo with all that is known of them on a day; the same for the same day.
 * @example demoHomes(calendarDay('2026-12-01'))['tai-aberllinos'].length // 3
 */
export function demoHomes(
  today: CalendarDay,
): Readonly<Record<DemoOrganisation['slug'], readonly DemoHome[]>> {
  const place = town()
  return { 'larrowside-homes': providerHomes(place, today), 'tai-aberllinos': landlordHomes(place, today) }
}
