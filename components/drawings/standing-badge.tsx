import { Badge } from '@/components/ui/badge'
import { type Tone } from '@/components/ui/state-mark'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { standingInWords } from '@/lib/duties/standing-in-words'
import { type Standing } from '@/lib/homes/standing'

const TONES: Record<Standing, Tone> = {
  'in date': 'verdigris',
  due: 'amber',
  lapsed: 'madder',
  'never inspected': 'madder',
  'unknown date': 'blueprint',
}

/** A home's duty state at a date, as shape, word and colour. */
export function StandingBadge(props: { standing: Standing; dueOn: CalendarDay | null; today: CalendarDay }) {
  return (
    <Badge tone={TONES[props.standing]} className="whitespace-nowrap">
      {standingInWords(props)}
    </Badge>
  )
}
