/** The small landlord's three homes, across the water in Aberllinos, under Welsh law. */
import { addDays } from '@/lib/calendar/add-days'
import { addYears } from '@/lib/calendar/add-years'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { seededRandom } from '../seeded-random'
import { placeOf } from '../town/plane'
import { type House } from '../town/plots'
import { type Town, VILLAGE_NAME } from '../town/town'
import { type DemoHome } from './demo-home'
import { draftOf } from './draft-of'
import { type Installation } from './installation'
import { reportOf } from './report'

const COTTAGE: Installation = {
  built: 1880,
  builtAbout: true,
  rewired: 1971,
  unitFitted: 1971,
  boardType: 'rewireable',
  rcdCover: 'none',
  wiring: 'pvc',
  ways: 'RRRRX',
}
const LATER: Installation = {
  ...COTTAGE,
  built: 1894,
  rewired: 2013,
  unitFitted: 2013,
  boardType: 'breakers',
  rcdCover: 'all',
  ways: '[BBB][BBB]',
}

/**
 * One whose report ends in eleven days (in Wales the day before the fifth anniversary), one in date, one that came
 * with hardly a fact.
 */
export function landlordHomes(town: Town, today: CalendarDay): DemoHome[] {
  const houses = town.buildings.flatMap((building) => building.houses)
  const on = (street: string) =>
    houses.find((house) => house.street.name === street && house.number >= 4) as House
  const draft = (row: number, house: House) => {
    const { latitude, longitude } = placeOf(house.point)
    return {
      row,
      address: `${house.number} ${house.street.name}`,
      postcode: `YX3 1A${'BDE'[row - 1] ?? 'F'}`,
      town: VILLAGE_NAME,
      tenure: 'private-rent' as const,
      uprn: row === 3 ? null : String(990_100_000_000 + row * 13 + 7),
      latitude: Number(latitude.toFixed(6)),
      longitude: Number(longitude.toFixed(6)),
    }
  }
  const firm = 'Gwifren Goch Electrical'
  const soon = addYears(addDays(today, 12), -5)
  const lately = addDays(today, -410)
  const report = (found: Installation, day: CalendarDay) =>
    reportOf(found, day, today, { firm, random: seededRandom(`landlord ${found.built}`) })
  const nothingMore = { corrections: [], officerDefects: [] }
  return [
    {
      draft: draftOf({
        ...draft(1, on('Heol y Cei')),
        built: { from: 1875, to: 1885, about: true },
        dwellingType: 'mid-terrace',
        bedrooms: 2,
      }),
      inspections: [report(COTTAGE, soon)],
      ...nothingMore,
    },
    {
      draft: draftOf({
        ...draft(2, on('Stryd yr Eglwys')),
        built: { from: 1894, to: 1894, about: false },
        dwellingType: 'end-terrace',
        bedrooms: 3,
        rewired: 2013,
      }),
      inspections: [report(LATER, lately)],
      ...nothingMore,
    },
    {
      draft: draftOf({ ...draft(3, on('Lôn Fain')), dwellingType: 'bungalow' }),
      inspections: [],
      ...nothingMore,
    },
  ]
}
