import { RangeBar } from '@/components/drawings/range-bar'
import { Card } from '@/components/ui/card'
import { Disclosure } from '@/components/ui/disclosure'
import { dayInWords } from '@/lib/calendar/day-in-words'
import { type HomeRow } from '@/lib/homes/home-row'
import { NATION_NAMES } from '@/lib/homes/nation'
import { type Assessment, type HazardAssessment } from '@/lib/risk/assessment'
import { bandOf } from '@/lib/risk/bands'
import { HAZARD_NAMES } from '@/lib/risk/explanation-words'
import { scoreInWords } from '@/lib/risk/harm-score'
import { SpreadOfHarm } from './home-spread-of-harm'
import { HomeMethodDisclosure } from './home-method-disclosure'
import { nextFactOf } from './home-next-fact'
import { HomeShiftTable } from './home-shift-table'
import { countOf, ordinal } from './home-words'

function bandInWords(score: number, home: HomeRow): string {
  const { name, comparison } = bandOf(score, home.nation)
  return comparison
    ? `Band ${name} by England’s scale, to compare by: ${NATION_NAMES[home.nation]} rates homes by another standard.`
    : `Band ${name}.`
}

function rangeInWords({ low, high, unknowns }: Assessment): string {
  if (unknowns.length === 0) return 'All that the method reads is known, so there is no range.'
  const facts = countOf(unknowns.length, 'fact')
  if (scoreInWords(low) === scoreInWords(high)) return `${facts} not known, without a bearing on the score.`
  return `Range ${scoreInWords(low)} to ${scoreInWords(high)}, from ${facts} not known.`
}

function OtherHazard({ hazard }: { hazard: HazardAssessment }) {
  const name = HAZARD_NAMES[hazard.hazard]
  return (
    <Disclosure
      summary={`${name}: ${scoreInWords(hazard.score)}, lower, so it does not rank`}
      className="mt-4 print:hidden"
    >
      <HomeShiftTable hazard={hazard} caption={`What bears on the likelihood: ${name}`} />
      <SpreadOfHarm hazard={hazard} />
    </Disclosure>
  )
}

type Props = {
  home: HomeRow
  assessment: Assessment | null
  rank: { readonly place: number; readonly of: number }
  className?: string
}

/** The score with everything that it is made of, and the fact that would say most. */
export function HomeScoreCard({ home, assessment, rank, className }: Props) {
  const title =
    rank.of > 1
      ? `Why it ranks ${ordinal(rank.place)} of ${rank.of.toLocaleString('en-GB')}`
      : 'Why it scores this'
  const hazards = [...(assessment?.hazards ?? [])].sort((a, b) => b.score - a.score)
  const [ranking, ...others] = hazards
  if (!assessment || !ranking) {
    return (
      <Card id="score" title="Score" className={className}>
        <p className="text-slate">
          No explanation of this home’s score is on record yet. It is scored again tonight, and with each
          change of its facts.
        </p>
      </Card>
    )
  }
  const next = nextFactOf(ranking)
  const name = HAZARD_NAMES[ranking.hazard]
  return (
    <Card id="score" title={title} className={className}>
      <div className="flex flex-wrap items-center gap-x-6 gap-y-3">
        <p className="figures text-[3.25rem] leading-none font-bold tracking-tight">
          <span className="sr-only">Score </span>
          {scoreInWords(assessment.score)}
        </p>
        <div className="min-w-0 flex-1 basis-64 print:basis-40">
          <RangeBar
            score={assessment.score}
            low={assessment.low}
            high={assessment.high}
            nation={home.nation}
            size="card"
          />
        </div>
      </div>
      <p className="mt-2 text-sm text-slate">
        {rangeInWords(assessment)} {bandInWords(assessment.score, home)} Method {assessment.methodVersion}, as
        of {dayInWords(assessment.assessedOn)}.
      </p>
      <h3 className="mt-5 mb-1 text-base print:mt-2">{name}</h3>
      <HomeShiftTable hazard={ranking} caption={`What bears on the likelihood: ${name}`} />
      <SpreadOfHarm hazard={ranking} />
      {next && (
        <div className="mt-4 rounded-plate bg-copper-wash px-4 py-3 print:mt-2 print:py-1.5">
          <p>
            <strong>Find out next:</strong> {next.what}. It would narrow the range more than anything else
            that is not known.
          </p>
          <p className="mt-1 text-sm">{next.how}</p>
        </div>
      )}
      {others.map((hazard) => (
        <OtherHazard key={hazard.hazard} hazard={hazard} />
      ))}
      <div className="mt-3 print:hidden">
        <HomeMethodDisclosure assessment={assessment} ranking={ranking} />
      </div>
    </Card>
  )
}
