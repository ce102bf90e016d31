// @vitest-environment happy-dom
import { cleanup, render, screen } from '@testing-library/react'
import { afterEach, describe, expect, it } from 'vitest'
import { BoardStrip } from '@/components/drawings/board-strip'
import { placeOnAxis, RangeBar } from '@/components/drawings/range-bar'
import { ShareBar } from '@/components/drawings/share-bar'
import { StandingBadge } from '@/components/drawings/standing-badge'
import { calendarDay } from '@/lib/calendar/calendar-day'

afterEach(cleanup)
const today = calendarDay('2026-12-01')
const imageName = () => screen.getByRole('img').getAttribute('aria-label')

describe('board strip', () => {
  it('says in words what it draws', () => {
    render(<BoardStrip ways="RRRRRU" boardType="rewireable" rcdCover="none" />)
    expect(imageName()).toBe('6 ways: 5 rewireable, 1 not known; no RCD')
  })

  it('dashes the way that is not known, and no other', () => {
    const { container } = render(<BoardStrip ways="RRBU" boardType="mixed" rcdCover="none" />)
    const dashed = container.querySelectorAll('[stroke-dasharray]')
    expect(dashed).toHaveLength(1)
    expect(dashed[0]?.getAttribute('class')).toContain('stroke-blueprint')
  })

  it('makes up no count where only the type is known: it fades and stays open', () => {
    const { container } = render(
      <BoardStrip ways={null} boardType="rewireable" rcdCover="unknown" size="full" />,
    )
    expect(imageName()).toBe('Rewireable fuses, number of ways not known; RCD cover not known')
    expect(
      [...container.querySelectorAll('g[opacity]')].map((group) => group.getAttribute('opacity')),
    ).toEqual(['1', '0.62', '0.3'])
    expect(container.querySelectorAll('text')).toHaveLength(0)
  })

  it('draws text that is no board as its type alone', () => {
    const { container } = render(<BoardStrip ways="R[B" boardType="mixed" rcdCover="part" />)
    expect(container.querySelectorAll('g[opacity]')).toHaveLength(3)
  })

  it('stays one path a layer, however many ways there are', () => {
    const { container } = render(<BoardStrip ways={'R'.repeat(40)} boardType="rewireable" rcdCover="none" />)
    expect(container.querySelectorAll('path').length).toBeLessThanOrEqual(6)
    expect(Number(container.querySelector('svg')?.getAttribute('width'))).toBeLessThanOrEqual(190)
  })

  it('is silent beside the same words', () => {
    render(<BoardStrip ways="RR" boardType="rewireable" rcdCover="none" decorative />)
    expect(screen.queryByRole('img')).toBeNull()
  })
})

describe('range bar', () => {
  it('sets scores on a log axis from 1 to 100,000, and what lies beyond at its ends', () => {
    expect([0, 1, 10, 1_000, 100_000, 900_000].map(placeOnAxis)).toEqual([0, 0, 0.2, 0.6, 1, 1])
  })

  it('names score, band and range', () => {
    render(<RangeBar score={3120} low={1400} high={5200} nation="wales" size="card" />)
    expect(imageName()).toBe('Score 3,120, band B, range 1,400 to 5,200')
  })

  it('says that the band is to compare by where the nation has another standard, and leaves out a range that is none', () => {
    render(<RangeBar score={88} low={88} high={88} nation="scotland" />)
    expect(imageName()).toBe('Score 88, band Low, to compare by')
  })
})

describe('standing badge', () => {
  it.each([
    ['lapsed', '2021-03-14', 'Lapsed 5 y 8 m', 'rect'],
    ['due', '2026-12-18', 'Due 18 Dec 2026', 'path'],
    ['in date', '2028-08-02', 'In date to Aug 2028', 'circle'],
    ['never inspected', null, 'Never inspected', 'rect'],
    ['unknown date', null, 'Unknown date', 'circle[stroke-dasharray]'],
  ] as const)('shows %s as a word and a shape', (standing, due, words, shape) => {
    const { container } = render(
      <StandingBadge standing={standing} dueOn={due && calendarDay(due)} today={today} />,
    )
    expect(screen.getByText(words)).toBeTruthy()
    expect(container.querySelector(`svg ${shape}`)).not.toBeNull()
  })
})

describe('share bar', () => {
  it('counts the unknown apart, and survives a patch without homes', () => {
    render(<ShareBar rewireable={214} unknown={61} total={1520} />)
    expect(imageName()).toBe('214 with rewireable fuses and 61 not known, of 1,520')
    cleanup()
    render(<ShareBar rewireable={0} unknown={0} total={0} />)
    expect(imageName()).toBe('0 with rewireable fuses and 0 not known, of 0')
  })
})
