'use client'
import Link from 'next/link'
import { useRouter } from 'next/navigation'
import { type KeyboardEvent, type PointerEvent, type ReactNode, useRef, useState } from 'react'
import { classNames } from '@/components/ui/class-names'
import { Disclosure } from '@/components/ui/disclosure'
import { addDays } from '@/lib/calendar/add-days'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { dayInWords } from '@/lib/calendar/day-in-words'
import { DueLineTable } from './due-line-table'
import {
  type DueLineWeek,
  monthMarks,
  roundHeight,
  type Stretch,
  stretchHref,
  stretchInWords,
} from './due-line-weeks'

type Props = {
  weeks: readonly DueLineWeek[]
  today: CalendarDay
  title?: ReactNode
}

const stretchOf = (one: number, other: number): Stretch => ({
  from: Math.min(one, other),
  to: Math.max(one, other),
})

function Key({ children, swatch }: { children: ReactNode; swatch: string }) {
  return (
    <span className="inline-flex items-center gap-1.5">
      <span className={classNames('size-3 rounded-[2px] border-[1.5px]', swatch)} aria-hidden="true" />
      {children}
    </span>
  )
}

/** One week: as tall as its homes; the booked part solid, the rest hollow; madder where its days are past. */
function WeekBar({ week, most, chosen }: { week: DueLineWeek; most: number; chosen: boolean }) {
  const booked = week.homes > 0 ? (week.booked ?? 0) / week.homes : 0
  return (
    <div className={classNames('flex h-full min-w-0 flex-1 items-end px-px', chosen && 'bg-copper-wash')}>
      {week.homes > 0 && (
        <div
          className={classNames(
            'flex min-h-1 w-full items-end rounded-t-[2px] border-x border-t sm:border-x-[1.5px] sm:border-t-[1.5px]',
            week.past ? 'border-madder' : 'border-copper',
            chosen && (week.past ? 'bg-madder-wash' : 'bg-surface'),
          )}
          style={{ height: `${(week.homes / most) * 100}%` }}
        >
          <div
            className={classNames('w-full', week.past ? 'bg-madder' : 'bg-verdigris')}
            style={{ height: `${booked * 100}%` }}
          />
        </div>
      )}
    </div>
  )
}

/**
 * The overdue past and the months to come as one line of weeks. Weeks are chosen by pointer (drag for several) or with
 * the arrow keys (with Shift for several); the line then gives the way to their homes.
 */
export function DueLine({ weeks, today, title = 'Reports lapsing, week by week' }: Props) {
  const router = useRouter()
  const line = useRef<HTMLDivElement>(null)
  const [anchor, setAnchor] = useState<number | null>(null)
  const [head, setHead] = useState<number | null>(null)
  const [hover, setHover] = useState<number | null>(null)
  const most = roundHeight(Math.max(...weeks.map(({ homes }) => homes), 0))
  const now = weeks.findIndex(({ monday }) => monday <= today && today <= addDays(monday, 6))
  const chosen = anchor !== null && head !== null ? stretchOf(anchor, head) : null
  const shown = chosen ?? (hover === null ? null : stretchOf(hover, hover))
  const hasBookings = weeks.some(({ booked }) => booked !== undefined)
  const percent = (at: number) => `${(at / weeks.length) * 100}%`

  const weekAt = (event: PointerEvent) => {
    const box = line.current?.getBoundingClientRect()
    if (!box) return 0
    return Math.max(
      0,
      Math.min(weeks.length - 1, Math.floor(((event.clientX - box.left) / box.width) * weeks.length)),
    )
  }
  const press = (event: PointerEvent<HTMLDivElement>) => {
    const at = weekAt(event)
    event.currentTarget.setPointerCapture(event.pointerId)
    if (!event.shiftKey || anchor === null) setAnchor(at)
    setHead(at)
  }
  const move = (event: PointerEvent<HTMLDivElement>) => {
    setHover(weekAt(event))
    if (event.buttons === 1) setHead(weekAt(event))
  }
  const key = (event: KeyboardEvent) => {
    const at = head ?? Math.max(0, now)
    const last = weeks.length - 1
    const goes: Record<string, number> = {
      ArrowRight: head === null ? at : at + 1,
      ArrowUp: at + 1,
      ArrowLeft: at - 1,
      ArrowDown: at - 1,
      PageUp: at + 4,
      PageDown: at - 4,
      Home: 0,
      End: last,
    }
    if (event.key === 'Enter' && chosen) return router.push(stretchHref(weeks, chosen))
    if (event.key === 'Escape') {
      setAnchor(null)
      return setHead(null)
    }
    const to = goes[event.key]
    if (to === undefined) return
    event.preventDefault()
    const kept = Math.max(0, Math.min(last, to))
    setHead(kept)
    if (!event.shiftKey || anchor === null) setAnchor(kept)
  }

  return (
    <section
      className="card border border-line bg-surface"
      aria-label={typeof title === 'string' ? title : 'Due line'}
    >
      <div className="flex flex-wrap items-center gap-x-5 gap-y-1 px-4 pt-3 text-sm text-slate">
        <h2 className="font-sans text-base font-semibold tracking-normal text-ink">{title}</h2>
        {hasBookings && <Key swatch="border-verdigris bg-verdigris">booked</Key>}
        <Key swatch="border-copper">{hasBookings ? 'not booked' : 'still in date'}</Key>
        <Key swatch="border-madder">lapsed</Key>
        <span className="no-print ml-auto flex min-h-6 flex-wrap items-center gap-x-3 max-sm:min-h-13 max-sm:w-full max-sm:content-start">
          <span>{shown ? stretchInWords(weeks, shown) : 'Choose weeks to list their homes'}</span>
          {chosen && (
            <Link href={stretchHref(weeks, chosen)} className="link-block link font-semibold">
              List them<span className="sr-only">: {stretchInWords(weeks, chosen)}</span>
            </Link>
          )}
        </span>
      </div>
      <div className="px-4 pt-8">
        <div
          ref={line}
          role="slider"
          tabIndex={0}
          aria-label="Week. Shift with the arrow keys takes several; Enter lists their homes"
          aria-valuemin={0}
          aria-valuemax={weeks.length - 1}
          aria-valuenow={head ?? Math.max(0, now)}
          aria-valuetext={stretchInWords(weeks, chosen ?? stretchOf(Math.max(0, now), Math.max(0, now)))}
          className="relative flex h-32 cursor-pointer touch-pan-y border-b-[1.5px] border-ink select-none sm:h-36"
          onPointerDown={press}
          onPointerMove={move}
          onPointerLeave={() => setHover(null)}
          onKeyDown={key}
        >
          <div className="pointer-events-none absolute inset-x-0 top-0 border-t border-dashed border-line" />
          <div className="pointer-events-none absolute top-0 right-0 bg-surface pl-1 text-xs leading-none text-slate tabular-nums">
            {most} a week
          </div>
          {weeks.map((week, at) => (
            <WeekBar
              key={week.monday}
              week={week}
              most={most}
              chosen={shown !== null && at >= shown.from && at <= shown.to}
            />
          ))}
          {now >= 0 && (
            <div
              className="pointer-events-none absolute -top-6 -bottom-2 border-l-2 border-ink"
              style={{ left: percent(now) }}
            >
              <span className="absolute top-0 left-1.5 text-sm leading-none font-semibold whitespace-nowrap">
                {dayInWords(today)}
              </span>
            </div>
          )}
        </div>
        <div className="relative h-7 text-xs text-slate" aria-hidden="true">
          {monthMarks(weeks).map(({ at, name }, index) => (
            <span
              key={at}
              className={classNames(
                'absolute top-1.5 border-line whitespace-nowrap',
                index % 3 !== 0 && 'max-sm:hidden',
                index % 2 !== 0 && 'sm:max-lg:hidden',
              )}
              style={{ left: percent(at) }}
            >
              {name}
            </span>
          ))}
        </div>
      </div>
      <Disclosure summary="As a table" className="no-print px-4 pt-1 pb-3 text-sm">
        <DueLineTable weeks={weeks} hasBookings={hasBookings} />
      </Disclosure>
    </section>
  )
}
