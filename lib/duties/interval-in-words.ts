/** The parts of a sentence on an interval. Both the due day and the standing are explained with them. */
import { dayInWords } from '@/lib/calendar/day-in-words'
import { type PartialDate } from '@/lib/calendar/partial-date'
import { partialDateInWords } from '@/lib/calendar/partial-date-in-words'
import { type IntervalRule, ruleCitation } from './interval-rules'

const NUMBERS: Record<number, string> = { 1: 'one', 2: 'two', 3: 'three', 4: 'four', 5: 'five' }

const yearsInWords = (rule: IntervalRule) => `${NUMBERS[rule.years] ?? rule.years} years`

/**
 * When the inspection was, and from which day it counts where the day is not known.
 * @example inspectedInWords({ day: '2016-03-01', precision: 'month' }) // 'Inspected in March 2016, counted from 1 March 2016'
 */
export function inspectedInWords(inspected: PartialDate): string {
  const date = partialDateInWords(inspected)
  if (inspected.precision === 'day') return `Inspected ${date}`
  return `Inspected in ${date}, counted from ${dayInWords(inspected.day)}`
}

/**
 * What a report covers at most, with what says so.
 * @example limitInWords(intervalRule('england', 'private'), 'law') // 'a report covers five years at most (SI 2020/312, reg 3(2))'
 */
export function limitInWords(rule: IntervalRule, decidedBy: 'law' | 'report'): string {
  const years = yearsInWords(rule)
  const citation = ruleCitation(rule)
  const source = rule.basis === 'practice' ? `good practice, ${citation}` : citation
  if (decidedBy === 'law') return `a report covers ${years} at most (${source})`
  return `the report asks for the next inspection sooner than the ${years} it may cover at most (${source})`
}

/**
 * How often a home is to be inspected, with what says so.
 * @example oftenInWords(intervalRule('wales', 'private')) // 'an inspection is owed every five years at least (WSI 2022/6, reg 6(2)(b))'
 */
export function oftenInWords(rule: IntervalRule): string {
  const citation = ruleCitation(rule)
  const verb = rule.basis === 'practice' ? 'an inspection is good practice' : 'an inspection is owed'
  return `${verb} every ${yearsInWords(rule)} at least (${citation})`
}
