/** How long an inspection report covers a home: one dated row for each nation and sector. */
import { type CalendarDay, dayOf } from '@/lib/calendar/calendar-day'
import { type Nation } from '@/lib/homes/nation'
import { type Sector } from './sector'

/**
 * The last day that a report covers. `anniversary`: "at intervals of no more than five years", so the
 * anniversary itself. `day-before`: "five years beginning with the inspection date", so the day before it.
 */
export type DayRule = 'anniversary' | 'day-before'

export type IntervalRule = {
  readonly nation: Nation
  readonly sector: Sector
  /** the longest that a report covers [years] */
  readonly years: number
  readonly dayRule: DayRule
  /** `enactment`: the law says so. `standard`: a published standard. `practice`: neither; taken as good practice */
  readonly basis: 'enactment' | 'standard' | 'practice'
  /** short form, for a sentence: 'SI 2020/312' */
  readonly instrument: string
  readonly title: string
  /** null where there is none to name */
  readonly clause: string | null
  readonly inForceFrom: CalendarDay
  /** null: still in force */
  readonly inForceTo: CalendarDay | null
  /** how the wording was found: `reported` is a secondary source, `recalled` was not checked */
  readonly confidence: 'read' | 'reported' | 'recalled'
  readonly source: string
}

const SAME_FOR_ALL = { years: 5, inForceTo: null } as const

/**
 * @source legislation.gov.uk: uksi/2020/312 reg 3; ukdsi/2025/9780348273007 reg 1(2) (made as SI 2025/1043);
 * wsi/2022/6/regulation/6; asp/2006/1 s.19A with ssi/2015/272 art 3; nisr/2024/201 reg 3. Read autumn 2026.
 */
export const INTERVAL_RULES: readonly IntervalRule[] = [
  {
    ...SAME_FOR_ALL,
    nation: 'england',
    sector: 'private',
    dayRule: 'anniversary',
    basis: 'enactment',
    instrument: 'SI 2020/312',
    title:
      'Electrical Safety Standards in the Private Rented Sector and Social Rented Sector (England) Regulations 2020',
    clause: 'reg 3(2)',
    inForceFrom: dayOf(2020, 6, 1),
    confidence: 'read',
    source: 'legislation.gov.uk/uksi/2020/312',
  },
  {
    ...SAME_FOR_ALL,
    nation: 'england',
    sector: 'social',
    dayRule: 'anniversary',
    basis: 'enactment',
    instrument: 'SI 2020/312 as amended by SI 2025/1043',
    title:
      'Electrical Safety Standards in the Private Rented Sector and Social Rented Sector (England) Regulations 2020',
    clause: 'reg 3(2)',
    // Tenancies granted from this day; those granted earlier came under it on 1 May 2026.
    inForceFrom: dayOf(2025, 12, 1),
    confidence: 'read',
    source: 'legislation.gov.uk/ukdsi/2025/9780348273007, reg 1(2)',
  },
  ...(['private', 'social'] as const).map((sector): IntervalRule => ({
    ...SAME_FOR_ALL,
    nation: 'wales',
    sector,
    dayRule: 'day-before',
    basis: 'enactment',
    instrument: 'WSI 2022/6',
    title: 'Renting Homes (Fitness for Human Habitation) (Wales) Regulations 2022',
    clause: 'reg 6(2)(b)',
    // Contracts made from this day; those converted from older tenancies a year later.
    inForceFrom: dayOf(2022, 12, 1),
    confidence: 'read',
    source: 'legislation.gov.uk/wsi/2022/6/regulation/6',
  })),
  {
    ...SAME_FOR_ALL,
    nation: 'scotland',
    sector: 'private',
    dayRule: 'anniversary',
    basis: 'enactment',
    instrument: 'Housing (Scotland) Act 2006',
    title: 'Housing (Scotland) Act 2006, inserted by the Housing (Scotland) Act 2014 s.23',
    // The interval is in s.19A; s.19B says who inspects and what the record holds.
    clause: 's.19A(2)',
    inForceFrom: dayOf(2015, 12, 1),
    confidence: 'reported',
    source: 'Repairing Standard statutory guidance, annex D.55; legislation.gov.uk/ssi/2015/272 art 3',
  },
  {
    ...SAME_FOR_ALL,
    nation: 'scotland',
    sector: 'social',
    dayRule: 'anniversary',
    basis: 'standard',
    instrument: 'Scottish Housing Quality Standard',
    title: 'Scottish Housing Quality Standard, guidance of the Scottish Government',
    clause: 'element 45',
    inForceFrom: dayOf(2022, 3, 31),
    // The five years are reported by electricalsafetyfirst.org.uk; element number and date are recalled.
    confidence: 'recalled',
    source: 'electricalsafetyfirst.org.uk, social landlords in Scotland',
  },
  {
    ...SAME_FOR_ALL,
    nation: 'northern-ireland',
    sector: 'private',
    dayRule: 'anniversary',
    basis: 'enactment',
    instrument: 'SR 2024/201',
    title: 'Electrical Safety Standards for Private Tenancies Regulations (Northern Ireland) 2024',
    clause: 'reg 3(2)',
    inForceFrom: dayOf(2025, 4, 1),
    confidence: 'read',
    source: 'legislation.gov.uk/nisr/2024/201',
  },
  {
    ...SAME_FOR_ALL,
    nation: 'northern-ireland',
    sector: 'social',
    dayRule: 'anniversary',
    basis: 'practice',
    instrument: 'the interval of SR 2024/201, which binds private landlords',
    title: 'Electrical Safety Standards for Private Tenancies Regulations (Northern Ireland) 2024',
    clause: null,
    inForceFrom: dayOf(2025, 4, 1),
    confidence: 'reported',
    source: 'SR 2024/201 leaves social landlords out; no enactment was found for their homes',
  },
]

/**
 * The rule in force for a nation and sector.
 * @example intervalRule('wales', 'private').dayRule // 'day-before'
 */
export function intervalRule(nation: Nation, sector: Sector): IntervalRule {
  const rule = INTERVAL_RULES.find(
    (one) => one.nation === nation && one.sector === sector && one.inForceTo === null,
  )
  if (!rule) throw new Error(`No interval rule for ${sector} homes in ${nation}`)
  return rule
}

/**
 * The rule as a citation.
 * @example ruleCitation(intervalRule('england', 'private')) // 'SI 2020/312, reg 3(2)'
 */
export function ruleCitation({ instrument, clause }: IntervalRule): string {
  return clause === null ? instrument : `${instrument}, ${clause}`
}
