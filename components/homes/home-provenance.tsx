import { partialDateInWords } from '@/lib/calendar/partial-date-in-words'
import { type PartialDate } from '@/lib/calendar/partial-date'
import { type FactSource } from '@/lib/homes/fact'
import { type OnRecord } from './home-shown'
import { momentInWords, SOURCE_NAMES } from './home-words'

/** A date that says itself how far it is known: "in March 2016", "on 14 March 2016". */
export function dateWithPrecision(date: PartialDate | null): string {
  if (date === null) return 'date not known'
  return date.precision === 'day' ? partialDateInWords(date) : `some day in ${partialDateInWords(date)}`
}

type Props = OnRecord & { source: FactSource; asOf: PartialDate | null; note: string | null }

/** Where a value comes from: source and date, who put it on record, and the note that was left with it. */
export function HomeProvenance({ source, asOf, note, recordedBy, recordedAt }: Props) {
  return (
    <>
      <span className="block print:inline">
        {SOURCE_NAMES[source]}, {dateWithPrecision(asOf)}
      </span>
      <span className="block text-sm text-slate print:inline">
        <span className="hidden print:inline">. </span>Put on record {momentInWords(recordedAt)}
        {recordedBy && ` by ${recordedBy}`}
        {note && `. ${note}`}
      </span>
    </>
  )
}
