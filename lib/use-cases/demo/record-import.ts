import { type WritingScope } from '@/db/connection'
import * as imports from '@/db/repositories/imports'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type Nation } from '@/lib/homes/nation'
import { type HomeDraft, type RowProblem } from '@/lib/imports/home-draft'
import { type RowOutcome } from '@/lib/imports/row-outcome'
import { tallyOutcomes } from '@/lib/imports/tally-outcomes'
import { newId } from '@/lib/platform/new-id'
import { figuresOf } from '@/lib/use-cases/imports/import-report'
import { createProblemLog } from '@/lib/use-cases/imports/problem-log'

const HEADINGS = ['Ref', 'Address', 'Postcode', 'Fuse board', 'Last inspection', 'C2']
const MAPPING = {
  reference: 0,
  address: 1,
  postcode: 2,
  'board-type': 3,
  'last-inspection': 4,
  'open-c2': 5,
} as const

/** Rows that the demo's stock list is said to have held and that could not be taken: one of each common slip. */
const REJECTED: readonly (readonly [
  cells: readonly string[],
  field: RowProblem['field'],
  why: string,
  cell: string,
])[] = [
  [
    ['LAR-09001', '3 Purl Yard', 'ZX2 4LN', 'Rewireable', '31/02/2020', ''],
    'last-inspection',
    'impossible date',
    '31/02/2020',
  ],
  [
    ['LAR-09002', '8 Selvedge Row', 'ZX2 4LP', 'MCBs', '12/11/2031', ''],
    'last-inspection',
    'date in the future',
    '12/11/2031',
  ],
  [['LAR-09003', '1 Tenter Close', 'ZXI 1AA', 'n/k', '2021', ''], 'postcode', 'postcode', 'ZXI 1AA'],
  [['LAR-09004', '5 Tenter Close', 'ZX1 1AB', 'RCBO', 'Aug 2023', 'two'], 'open-c2', 'not a number', 'two'],
]

type Source = {
  readonly fileName: string
  readonly actorId: string
  readonly nation: Nation
  readonly drafts: readonly HomeDraft[]
  readonly today: CalendarDay
  /** the provider's list had slips in it; the landlord's three rows had none */
  readonly slips: boolean
}

/** Leaves the import that the demo's homes came by, with its report, as a person's import would have. */
export async function recordImport(
  scope: WritingScope,
  { fileName, actorId, nation, drafts, today, slips }: Source,
): Promise<void> {
  const id = newId()
  const last = drafts.at(-1)?.row ?? 1
  const rejected = (slips ? REJECTED : []).map(([cells, field, why, cell], at) => ({
    cells,
    problem: { row: last + at + 1, field, severity: 'rejected', why, cell } satisfies RowProblem,
  }))
  const outcomes: RowOutcome[] = [
    ...drafts.map((draft): RowOutcome => ({ kind: 'accepted', row: draft.row, draft, problems: [] })),
    ...rejected.map(({ problem }): RowOutcome => ({
      kind: 'rejected',
      row: problem.row,
      problems: [problem],
    })),
  ]
  const tally = tallyOutcomes(outcomes, { sheet: '', headerRow: 1, today, nation })
  const report = figuresOf({
    tally,
    homes: { added: drafts.length, changed: 0, unchanged: 0 },
    clashes: 0,
    kept: {},
  })
  const layout = {
    fileKind: 'Excel workbook',
    sheets: [{ name: '', index: 0 }],
    sheet: 0,
    headerRow: 1,
    headings: HEADINGS,
    sample: [],
    mapping: MAPPING,
  }
  await imports.insert(scope, {
    id,
    fileName,
    fileKey: '',
    fileSize: 0,
    fileSha256: '',
    layout,
    startedBy: actorId,
  })
  await imports.move(scope, id, ['uploaded'], 'done', { report, rowsTotal: tally.data_rows })
  const problems = createProblemLog(id, layout)
  for (const { cells, problem } of rejected) problems.addRow({ number: problem.row, cells }, [problem])
  await problems.write(scope)
}
