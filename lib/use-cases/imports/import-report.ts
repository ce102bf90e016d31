import { type ImportTally } from '@/lib/imports/tally-outcomes'
import { type Applied } from './apply-drafts'

/** What an import found and did. */
export type ImportReport = {
  readonly tally: ImportTally
  /** of the rows accepted: homes that are new, that change, that stay as they are */
  readonly homes: Applied
  /** rows that read well and still cannot be taken, beside those in the tally */
  readonly clashes: number
  /** how often the register's own word was kept against the file's, by what it was about */
  readonly kept: Readonly<Record<string, number>>
}

type Figures = Pick<
  ImportTally,
  'data_rows' | 'accepted' | 'board' | 'rcd' | 'standing' | 'out_of_scope_tenure'
>

/** What is kept of a report with its import: the figures. The rows themselves are kept as its problems. */
export type KeptReport = Omit<ImportReport, 'tally'> & { readonly tally: Figures; readonly rejected: number }

export function figuresOf({ tally, homes, clashes, kept }: ImportReport): KeptReport {
  const { data_rows, accepted, board, rcd, standing, out_of_scope_tenure, rejected } = tally
  return {
    tally: { data_rows, accepted, board, rcd, standing, out_of_scope_tenure },
    rejected: rejected.length + clashes,
    homes,
    clashes,
    kept,
  }
}
