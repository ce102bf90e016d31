// @vitest-environment happy-dom
import { cleanup, render, screen, within } from '@testing-library/react'
import { afterEach, describe, expect, it } from 'vitest'
import { HomeScreen } from '@/components/homes/home-screen'
import { type HomeShown } from '@/components/homes/home-shown'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { FACT_NAMES } from '@/lib/homes/fact'
import { harmScore } from '@/lib/risk/harm-score'
import { A_BARE_HOME, A_KNOWN_HOME, aDefect, aFact, aHomeShown, TODAY } from './home-shown-example'

afterEach(cleanup)

const show = (shown: HomeShown, said: string | null = null) =>
  render(<HomeScreen shown={shown} today={TODAY} said={said} closeDefect={async (state) => state} />)
const region = (name: string | RegExp) => screen.getByRole('region', { name })

describe('a home of which nothing is known', () => {
  it('says so in every part, and what to do first', () => {
    show(aHomeShown(A_BARE_HOME))
    expect(screen.getByRole('heading', { level: 1 }).textContent).toBe('14 Lantern Row')
    expect(region('Consumer unit').textContent).toContain('Nobody has told the register')
    expect(within(region('Consumer unit')).getByRole('link', { name: 'Say what is there' })).toBeTruthy()
    expect(region('No open defect')).toBeTruthy()
    expect(region('Facts').textContent).toContain('0 of 8 known')
    expect(within(region('Facts')).getAllByText('Not known')).toHaveLength(8)
    expect(region('Inspections').textContent).toContain('No inspection on record')
    expect(region('Score through time').textContent).toContain('No score is on record yet')
    expect(region('Note').textContent).toContain('No note')
    expect(region('Place').textContent).toContain('Not on the map')
  })

  it('names its unknowns as means in the score, and one to find out next', () => {
    show(aHomeShown(A_BARE_HOME))
    const score = region('Why it ranks 3rd of 2,412')
    expect(within(score).getAllByText('the mean of what it could be').length).toBeGreaterThan(4)
    expect(score.textContent).toContain('Find out next:')
  })

  it('keeps its place where no explanation is on record', () => {
    show(aHomeShown(A_BARE_HOME, { assessment: null }))
    expect(region('Score').textContent).toContain('No explanation')
  })
})

describe('a home that is known', () => {
  const facts = aHomeShown(A_KNOWN_HOME).facts.map((fact) =>
    fact.kind === 'board-type'
      ? {
          ...fact,
          current: aFact('board-type', 'rewireable'),
          before: [
            aFact('board-type', 'breakers', {
              id: 'older',
              source: 'import',
              note: 'stock list.xlsx, row 412',
            }),
          ],
        }
      : fact,
  )

  it('shows the board in words, with where it is from, and the fact before it', () => {
    show(aHomeShown(A_KNOWN_HOME, { facts }))
    expect(region('Consumer unit').textContent).toContain('6 ways: 5 rewireable, 1 not known; no RCD')
    expect(region('Consumer unit').textContent).toContain('From an inspection, 14 March 2016')
    const of = region('Facts')
    expect(of.textContent).toContain('Put on record 1 July 2026 by Ada Marsh')
    expect(within(of).getByText('1 earlier value')).toBeTruthy()
    expect(of.textContent).toContain('stock list.xlsx, row 412')
  })

  it('puts the hazard with the higher score first, with the other below it', () => {
    const shown = aHomeShown(A_KNOWN_HOME)
    const [first, second] = [...(shown.assessment?.hazards ?? [])].sort((a, b) => b.score - a.score)
    show(shown)
    const tables = screen.getAllByRole('table', { name: /What bears on the likelihood/ })
    expect(tables).toHaveLength(2)
    expect(first?.score).toBeGreaterThan(second?.score ?? Infinity)
    const names = { electrical: 'Electrical hazards', fire: 'Fire, electrical part' }
    expect(tables[0]?.textContent).toContain('The average to start from')
    expect(screen.getByRole('heading', { level: 3, name: names[first?.hazard ?? 'fire'] })).toBeTruthy()
  })

  it('shows the published formula with figures that give the score shown', () => {
    // the formula: SI 2005/3208 and SI 2006/1702 (W.164), regulation 6
    const shown = aHomeShown(A_KNOWN_HOME)
    show(shown)
    const text = screen.getByText(/÷/).textContent ?? ''
    const figures = (text.match(/[\d,]+(?:\.\d+)?/g) ?? []).map((figure) =>
      Number(figure.replaceAll(',', '')),
    )
    const [, a = 0, , b = 0, , c = 0, , d = 0, oneIn = 1, score = 0] = figures
    expect(figures.filter((_, at) => at % 2 === 0).slice(0, 4)).toEqual([10_000, 1_000, 300, 10])
    expect(Math.abs(harmScore(oneIn, [a, b, c, d]) - score)).toBeLessThanOrEqual(0.6)
    expect(score).toBe(Math.round(shown.assessment?.score ?? 0))
  })

  it('shows the bands as a comparison where the nation rates homes otherwise', () => {
    show(aHomeShown({ ...A_KNOWN_HOME, nation: 'scotland' }))
    expect(region(/Why it ranks/).textContent).toContain('to compare by: Scotland')
  })

  it('says that a long lease lies outside the duty', () => {
    const shown = aHomeShown({ ...A_KNOWN_HOME, tenure: 'leasehold' })
    show({ ...shown, standing: { ...shown.standing, isOwed: false } })
    expect(screen.getByText('Leasehold: outside the duty to inspect')).toBeTruthy()
    expect(region('Standing').textContent).toContain('The duty does not reach this home')
  })

  it('says once what has just been done, and reads it out', () => {
    show(aHomeShown(A_KNOWN_HOME), 'The defect is closed.')
    expect(screen.getAllByRole('status').map((line) => line.textContent)).toContain('The defect is closed.')
  })
})

describe('defects', () => {
  const closed = aDefect({
    id: 'defect-2',
    closedOn: calendarDay('2016-04-02'),
    closedNote: 'Certificate 881.',
    closedBy: 'Tom Reed',
  })

  it('shows open ones with code, meaning and age, and closed ones with what proves it', () => {
    show(
      aHomeShown(
        { ...A_KNOWN_HOME, open: { C1: 1, C2: 0, C3: 0, FI: 0 } },
        { openDefects: [aDefect({ code: 'C1' })], closedDefects: [closed] },
      ),
    )
    const card = region('1 open defect')
    expect(card.textContent).toContain('Danger present')
    expect(card.textContent).toContain('open for 3,914 days')
    expect(card.textContent).toContain('put right 2 April 2016, closed by Tom Reed')
    expect(card.textContent).toContain('Certificate 881.')
    expect(card.textContent).toContain('A code is the inspector’s own')
  })

  it('gives each open one a form of its own, and nobody who may only read', () => {
    const shown = aHomeShown(A_KNOWN_HOME, { openDefects: [aDefect(), aDefect({ id: 'defect-3' })] })
    show(shown)
    const forms = screen.getAllByRole('form', { name: /^Close \d of 2, C2/, hidden: true })
    expect(new Set(forms.map((form) => form.getAttribute('aria-label'))).size).toBe(2)
    expect(forms.map((form) => new FormData(form as HTMLFormElement).get('defectId'))).toEqual([
      'defect-1',
      'defect-3',
    ])
    cleanup()
    show({ ...shown, mayEdit: false })
    expect(screen.queryAllByRole('form', { hidden: true })).toEqual([])
    const offered = screen.getAllByRole('link').map((link) => link.textContent)
    for (const what of ['Record an inspection', 'Correct facts', 'Add a defect', 'Change address and tenure'])
      expect(offered).not.toContain(what)
  })
})

it('leaves out whether it was ever inspected once an inspection is on record', () => {
  const facts = aHomeShown(A_KNOWN_HOME).facts.map((fact) =>
    fact.kind === 'inspection-record' ? { ...fact, current: aFact('inspection-record', 'reported') } : fact,
  )
  show(aHomeShown(A_KNOWN_HOME, { facts }))
  expect(within(region('Facts')).getByText(FACT_NAMES['inspection-record'])).toBeTruthy()
  cleanup()
  const inspection = {
    ...aFact('ways', null),
    inspectedOn: { day: TODAY, precision: 'day' as const },
    assessment: null,
    nextDueOn: null,
    withdrawnAt: null,
  }
  show(aHomeShown(A_KNOWN_HOME, { facts, inspections: [inspection] }))
  expect(within(region('Facts')).queryByText(FACT_NAMES['inspection-record'])).toBeNull()
})
