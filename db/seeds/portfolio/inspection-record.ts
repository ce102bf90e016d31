/** When a home was last inspected, as far as the register knows. Days count back from the day of the seeding. */
import { addDays } from '@/lib/calendar/add-days'
import { type CalendarDay, calendarDay } from '@/lib/calendar/calendar-day'
import { type PartialDate } from '@/lib/calendar/partial-date'
import { type SeededRandom, seededRandom } from '../seeded-random'

export type InspectionRecordOf =
  | { readonly kind: 'never' }
  | { readonly kind: 'unknown'; readonly reported: boolean }
  | { readonly kind: 'dated'; readonly on: PartialDate; readonly before: CalendarDay | null }

const FIVE_YEARS = 1826 // [days]

/** A street was inspected in one go, so many days ago; many were just under five years ago. */
function campaignOf(street: string): number {
  const random = seededRandom(`campaign of ${street}`)
  const when = random.weighted({ spread: 70, hump: 23, late: 7 })
  if (when === 'hump') return random.whole(FIVE_YEARS - 150, FIVE_YEARS - 4)
  if (when === 'late') return random.whole(FIVE_YEARS + 10, FIVE_YEARS + 420)
  return random.whole(40, FIVE_YEARS - 160)
}

/** To the first day of what is known, as the register keeps it. */
function known(day: CalendarDay, precision: PartialDate['precision']): PartialDate {
  if (precision === 'year') return { day: calendarDay(`${day.slice(0, 4)}-01-01`), precision }
  if (precision === 'month') return { day: calendarDay(`${day.slice(0, 7)}-01`), precision }
  return { day, precision }
}

/**
 * @param fromReport the register holds the report itself, so the date is known to the day
 * @param built no inspection is older than the home
 */
export function inspectionRecordOf(
  home: { key: string; street: string; built: number; fromReport: boolean },
  today: CalendarDay,
): InspectionRecordOf {
  const random = seededRandom(`inspected ${home.key}`)
  const fate = random.weighted({ campaign: 76, own: 14, missed: 5, unknown: 3.2, never: 1.8 })
  if (fate === 'never' || (fate === 'unknown' && !home.fromReport))
    return fate === 'never' ? { kind: 'never' } : { kind: 'unknown', reported: random.chance(0.5) }
  const daysAgo = {
    campaign: () => campaignOf(home.street) + random.whole(-9, 9),
    own: () => random.whole(3, FIVE_YEARS - 20),
    // nobody in when the street was done, and nothing since
    missed: () => FIVE_YEARS + random.whole(15, 1500),
    unknown: () => random.whole(20, FIVE_YEARS),
  }[fate]()
  const day = addDays(today, -Math.max(1, daysAgo))
  if (Number(day.slice(0, 4)) <= home.built)
    return dated(random, addDays(today, -random.whole(30, 900)), true, home)
  return dated(random, day, home.fromReport, home)
}

function dated(
  random: SeededRandom,
  day: CalendarDay,
  toTheDay: boolean,
  home: { built: number },
): InspectionRecordOf {
  const precision = toTheDay ? 'day' : random.weighted({ day: 78, month: 14, year: 8 })
  const before = addDays(day, -FIVE_YEARS - random.whole(-40, 260))
  return {
    kind: 'dated',
    on: known(day, precision),
    before: Number(before.slice(0, 4)) > home.built + 1 && random.chance(0.3) ? before : null,
  }
}
