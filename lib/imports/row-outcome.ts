/** What became of one row of a stock list. Types only. */
import { type HomeDraft, type RowProblem } from './home-draft'

/** `total` is a row of the sheet that is no home: a total, the headings once more, a remark or a section's name. */
export type RowOutcome =
  | { readonly kind: 'blank'; readonly row: number }
  | { readonly kind: 'total'; readonly row: number; readonly why: string }
  | {
      readonly kind: 'accepted'
      readonly row: number
      readonly draft: HomeDraft
      readonly problems: readonly RowProblem[]
    }
  | { readonly kind: 'rejected'; readonly row: number; readonly problems: readonly RowProblem[] }
