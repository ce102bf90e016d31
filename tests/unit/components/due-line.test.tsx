// @vitest-environment happy-dom
import { cleanup, fireEvent, render, screen, within } from '@testing-library/react'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { DueLine } from '@/components/drawings/due-line'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { dueWeeks } from '@/lib/duties/due-weeks'

const push = vi.fn()
// The framework's router is the one thing that a test without a browser has not got.
vi.mock('next/navigation', () => ({ useRouter: () => ({ push }) }))
afterEach(cleanup)

const today = calendarDay('2026-12-01')
const counts = [
  { day: calendarDay('2026-11-20'), homes: 3 },
  { day: calendarDay('2026-12-01'), homes: 5 },
  { day: calendarDay('2026-12-09'), homes: 7 },
]
const show = () => {
  render(<DueLine weeks={dueWeeks(counts, today, { weeksBack: 4, weeksOn: 8 })} today={today} />)
  return screen.getByRole('slider')
}

describe('due line', () => {
  it('starts at this week, and moves by arrow keys', () => {
    const line = show()
    expect(line.getAttribute('aria-valuetext')).toBe('Week of 30 November 2026: 5 homes')
    fireEvent.keyDown(line, { key: 'ArrowRight' })
    fireEvent.keyDown(line, { key: 'ArrowRight' })
    expect(line.getAttribute('aria-valuetext')).toBe('Week of 7 December 2026: 7 homes')
  })

  it('takes several weeks with Shift, and gives the way to their homes', () => {
    const line = show()
    fireEvent.keyDown(line, { key: 'ArrowRight' })
    fireEvent.keyDown(line, { key: 'ArrowRight', shiftKey: true })
    const link = screen.getByRole('link', { name: /List them/ })
    expect(link.getAttribute('href')).toBe(
      '/homes?dueFrom=2026-11-30&dueTo=2026-12-13&duty=owed&sort=due&order=asc',
    )
    fireEvent.keyDown(line, { key: 'Enter' })
    expect(push).toHaveBeenCalledWith(link.getAttribute('href'))
  })

  it('lets go with Escape and stops at its ends', () => {
    const line = show()
    fireEvent.keyDown(line, { key: 'End' })
    fireEvent.keyDown(line, { key: 'ArrowRight' })
    expect(line.getAttribute('aria-valuenow')).toBe('11')
    fireEvent.keyDown(line, { key: 'Escape' })
    expect(screen.queryByRole('link', { name: /List them/ })).toBeNull()
  })

  it('is a table too, of the weeks that have homes', () => {
    show()
    const rows = within(screen.getByRole('table', { hidden: true })).getAllByRole('row', { hidden: true })
    expect(rows.slice(1).map((row) => [...row.children].map((cell) => cell.textContent))).toEqual([
      ['16 November 2026', '3', 'lapsed'],
      ['30 November 2026', '5', 'in date till then'],
      ['7 December 2026', '7', 'in date till then'],
    ])
  })
})
