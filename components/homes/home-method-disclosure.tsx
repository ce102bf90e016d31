import { Disclosure } from '@/components/ui/disclosure'
import { type Assessment, type HazardAssessment } from '@/lib/risk/assessment'
import { HAZARD_NAMES } from '@/lib/risk/explanation-words'
import { CLASS_WEIGHTS, scoreInWords } from '@/lib/risk/harm-score'

const share = (percent: number) => percent.toLocaleString('en-GB', { maximumFractionDigits: 1 })

/** The published formula with this home's figures in it. */
function Formula({ hazard }: { hazard: HazardAssessment }) {
  const sum = hazard.spread
    .map((percent, at) => `${(CLASS_WEIGHTS[at] ?? 0).toLocaleString('en-GB')} × ${share(percent)}`)
    .join(' + ')
  const oneIn = hazard.oneIn.toLocaleString('en-GB', { maximumSignificantDigits: 5 })
  return (
    <p className="border-l-4 border-line py-1 pl-3 figures text-sm">
      ( {sum} ) ÷ {oneIn} = {scoreInWords(hazard.score)}
    </p>
  )
}

/** Where the figures of a hazard are from, each source once. */
function Sources({ hazard }: { hazard: HazardAssessment }) {
  const sources = new Map<string, string[]>()
  for (const { reason, source, basis } of hazard.shifts) {
    const key = `${basis}: ${source}`
    sources.set(key, [...(sources.get(key) ?? []), reason])
  }
  return (
    <ul className="mt-2 list-disc space-y-1 pl-5 text-sm">
      <li>
        The average ({hazard.base.basis}): {hazard.base.source}.
      </li>
      {[...sources].map(([source, reasons]) => (
        <li key={source}>
          {reasons.join(', ')} ({source}).
        </li>
      ))}
      <li>The spread of harm ({hazard.spreadBasis}).</li>
    </ul>
  )
}

/** How the number is made, and what it cannot say. */
export function HomeMethodDisclosure({
  assessment,
  ranking,
}: {
  assessment: Assessment
  ranking: HazardAssessment
}) {
  return (
    <Disclosure summary="How this number is made">
      <div className="space-y-3">
        <p>
          The formula is the published one of the housing hazard rating (SI 2005/3208; in Wales SI 2006/1702):
          how badly people are hurt, by four classes of harm in percent, over how likely it is in twelve
          months. For {HAZARD_NAMES[ranking.hazard].toLowerCase()} here:
        </p>
        <Formula hazard={ranking} />
        <p>
          A step is one point of the published scale of likelihoods, about 1.8 times as likely. It starts from
          the national average for a home of this age and kind, and each fact moves it up or down. What is not
          known is averaged over everything that it could be, so that a gap in the record never counts as good
          news. The same facts, day and method give the same number.
        </p>
        <Sources hazard={ranking} />
        <h4 className="font-semibold">What it cannot say</h4>
        <ul className="list-disc space-y-1 pl-5">
          <li>It puts homes in order. It does not foretell an accident in this one.</li>
          <li>
            The averages are national and some are old (1997 to 1999); how far a fact moves them is mostly
            judgement, and marked so.
          </li>
          <li>
            The rating itself is done by a person in the home. A score here is no assessment under the law,
            and no code: an inspector gives those.
          </li>
        </ul>
        <p className="text-sm text-slate">Method {assessment.methodVersion}.</p>
      </div>
    </Disclosure>
  )
}
