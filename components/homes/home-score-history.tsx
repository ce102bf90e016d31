import { RangeBar } from '@/components/drawings/range-bar'
import { Disclosure } from '@/components/ui/disclosure'
import { Cell, HeadCell, Row, RowHead, Table } from '@/components/ui/table'
import { partialDateInWords } from '@/lib/calendar/partial-date-in-words'
import { type Nation } from '@/lib/homes/nation'
import { scoreInWords } from '@/lib/risk/harm-score'
import { HomeSection } from './home-section'
import { type ScoreShown } from './home-shown'
import { countOf } from './home-words'

const SHOWN_AT_FIRST = 6

const rangeInWords = (low: number, high: number) =>
  scoreInWords(low) === scoreInWords(high) ? 'none' : `${scoreInWords(low)} to ${scoreInWords(high)}`

function Scores({
  scores,
  nation,
  caption,
}: {
  scores: readonly ScoreShown[]
  nation: Nation
  caption: string
}) {
  return (
    <Table caption={caption}>
      <thead>
        <tr>
          <HeadCell>From</HeadCell>
          <HeadCell numeric>Score</HeadCell>
          <HeadCell numeric>Range</HeadCell>
          <HeadCell className="hidden sm:table-cell">On the scale</HeadCell>
          <HeadCell className="hidden sm:table-cell">Method</HeadCell>
        </tr>
      </thead>
      <tbody>
        {scores.map(({ on, score, low, high, methodVersion }, at) => (
          <Row key={`${on} ${at}`}>
            <RowHead className="whitespace-nowrap">
              {partialDateInWords({ day: on, precision: 'day' }, 'short')}
            </RowHead>
            <Cell numeric className="figures">
              {scoreInWords(score)}
            </Cell>
            <Cell numeric className="whitespace-nowrap text-slate">
              {rangeInWords(low, high)}
            </Cell>
            <Cell className="hidden sm:table-cell">
              <RangeBar score={score} low={low} high={high} nation={nation} decorative />
            </Cell>
            <Cell className="hidden sm:table-cell">{methodVersion}</Cell>
          </Row>
        ))}
      </tbody>
    </Table>
  )
}

/** The scores that this home has had, the newest first. */
export function HomeScoreHistory({ history, nation }: { history: readonly ScoreShown[]; nation: Nation }) {
  const newest = [...history].reverse()
  const older = newest.slice(SHOWN_AT_FIRST)
  return (
    <HomeSection id="scores" title="Score through time" className="print:hidden">
      {newest.length === 0 ? (
        <p className="text-slate">No score is on record yet. Each one is kept from the first on.</p>
      ) : (
        <Scores
          scores={newest.slice(0, SHOWN_AT_FIRST)}
          nation={nation}
          caption="Scores of this home, newest first"
        />
      )}
      {older.length > 0 && (
        <Disclosure summary={`${countOf(older.length, 'older score')}`} className="mt-3 print:hidden">
          <Scores scores={older} nation={nation} caption="Older scores of this home" />
        </Disclosure>
      )}
    </HomeSection>
  )
}
