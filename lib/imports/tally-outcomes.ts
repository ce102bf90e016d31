/** What an import found, counted: the same object for the screen, the command line and the tests. */
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { inspectionDue } from '@/lib/duties/inspection-interval'
import { sectorOf } from '@/lib/duties/sector'
import { standingOf } from '@/lib/duties/standing-of'
import { type BoardType, hasRewireableWays } from '@/lib/homes/board-type'
import { type Nation } from '@/lib/homes/nation'
import { type RcdCover } from '@/lib/homes/rcd-cover'
import { type Standing } from '@/lib/homes/standing'
import { isInScope } from '@/lib/homes/tenure'
import { type HomeDraft, type RowProblem } from './home-draft'
import { type RowOutcome } from './row-outcome'

type RowWhy = { readonly row: number; readonly why: string }
type Counts<Key extends string> = Partial<Record<Key, number>>

export type ImportTally = {
  today: CalendarDay
  sheet: string
  header_row: number
  /** rows that are meant as homes: accepted and rejected; blank rows, totals and remarks are none */
  data_rows: number
  accepted: number
  /** one entry a row; several problems of one row are parted by semicolons */
  rejected: RowWhy[]
  /** inspection dates known only to the month or the year */
  warned: RowWhy[]
  board: Counts<BoardType>
  rcd: Counts<RcdCover>
  /** the law's own position: no notice window; homes out of scope are counted too */
  standing: Counts<Standing>
  rewireable_by_patch: Record<string, number>
  open_c1: number
  open_c2: number
  open_fi: number
  out_of_scope_tenure: number
  blank_rows: number
  /** rows that are no homes, with what they were taken for */
  set_aside: RowWhy[]
  /** every other thing worth knowing of an accepted row */
  noted: (RowWhy & { readonly field: string | null })[]
  communal: number
  with_place: number
}

export type TallyOptions = { sheet: string; headerRow: number; today: CalendarDay; nation: Nation }

const NO_PATCH = 'no patch'
const isDateNote = ({ field, why }: RowProblem) =>
  field === 'last-inspection' && why.startsWith('date known to the')

function count<Key extends string>(counts: Counts<Key>, key: Key): void {
  counts[key] = (counts[key] ?? 0) + 1
}

/** Where a home stands at a date by the law and its report, from the earliest reading of a partly known date. */
export function standingOfDraft(draft: HomeDraft, today: CalendarDay, nation: Nation): Standing {
  const due = draft.lastInspection
    ? inspectionDue(draft.nation ?? nation, draft.lastInspection, draft.nextDue, sectorOf(draft.tenure)).dueOn
    : null
  // A notice window that has ended yesterday leaves nothing due: only the law's own day counts.
  return standingOf({ record: draft.inspectionRecord, dueOn: due, today, noticeDays: -1 })
}

function countDraft(tally: ImportTally, draft: HomeDraft, nation: Nation): void {
  tally.accepted += 1
  count(tally.board, draft.boardType)
  count(tally.rcd, draft.rcdCover)
  count(tally.standing, standingOfDraft(draft, tally.today, nation))
  if (hasRewireableWays(draft.boardType)) count(tally.rewireable_by_patch, draft.patch ?? NO_PATCH)
  tally.open_c1 += draft.open.C1 ?? 0
  tally.open_c2 += draft.open.C2 ?? 0
  tally.open_fi += draft.open.FI ?? 0
  if (!isInScope(draft.tenure)) tally.out_of_scope_tenure += 1
  if (draft.kind === 'communal') tally.communal += 1
  if (draft.latitude !== null) tally.with_place += 1
}

/**
 * A tally that grows outcome by outcome, for a file that is read as a stream.
 * @example
 * const tally = createTally({ sheet: 'Stock 2026', headerRow: 4, today, nation: 'england' })
 * for await (const row of rows) tally.add(reader.read(row))
 * tally.result().accepted // 632
 */
export function createTally({ sheet, headerRow, today, nation }: TallyOptions) {
  const tally: ImportTally = {
    today,
    sheet,
    header_row: headerRow,
    data_rows: 0,
    accepted: 0,
    rejected: [],
    warned: [],
    board: {},
    rcd: {},
    standing: {},
    rewireable_by_patch: {},
    open_c1: 0,
    open_c2: 0,
    open_fi: 0,
    out_of_scope_tenure: 0,
    blank_rows: 0,
    set_aside: [],
    noted: [],
    communal: 0,
    with_place: 0,
  }
  return {
    add(outcome: RowOutcome): void {
      const { row } = outcome
      if (outcome.kind === 'blank') tally.blank_rows += 1
      else if (outcome.kind === 'total') tally.set_aside.push({ row, why: outcome.why })
      else if (outcome.kind === 'rejected') {
        const whys = outcome.problems.filter((one) => one.severity === 'rejected').map((one) => one.why)
        tally.rejected.push({ row, why: [...new Set(whys)].join('; ') })
      } else {
        for (const problem of outcome.problems) {
          if (isDateNote(problem)) tally.warned.push({ row, why: problem.why })
          else tally.noted.push({ row, why: problem.why, field: problem.field })
        }
        countDraft(tally, outcome.draft, nation)
      }
      tally.data_rows = tally.accepted + tally.rejected.length
    },
    result: (): ImportTally => tally,
  }
}

/** The tally of outcomes that are all at hand. */
export function tallyOutcomes(outcomes: Iterable<RowOutcome>, options: TallyOptions): ImportTally {
  const tally = createTally(options)
  for (const outcome of outcomes) tally.add(outcome)
  return tally.result()
}
