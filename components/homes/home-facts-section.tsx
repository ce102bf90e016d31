import { ButtonLink } from '@/components/ui/button-link'
import { Disclosure } from '@/components/ui/disclosure'
import { StateMark } from '@/components/ui/state-mark'
import { FACT_NAMES } from '@/lib/homes/fact'
import { factValueInWords } from '@/lib/homes/fact-value'
import { HomeProvenance } from './home-provenance'
import { HomeSection } from './home-section'
import { type FactHistoryShown, type FactShown } from './home-shown'
import { countOf } from './home-words'

function Value({ fact }: { fact: FactShown | null }) {
  if (fact && fact.value !== null)
    return <span className="font-semibold">{factValueInWords(fact.kind, fact.value)}</span>
  return (
    <span className="inline-flex items-baseline gap-2 text-blueprint">
      <StateMark tone="blueprint" className="translate-y-px" />
      Not known
    </span>
  )
}

/** What a fact was before: each earlier value with where it came from. */
function Earlier({ before }: { before: readonly FactShown[] }) {
  if (before.length === 0) return null
  return (
    <Disclosure summary={countOf(before.length, 'earlier value')} className="mt-1 text-sm print:hidden">
      <ol className="space-y-2 border-l-4 border-line pl-3">
        {before.map((fact) => (
          <li key={fact.id}>
            <Value fact={fact} />
            <HomeProvenance {...fact} />
          </li>
        ))}
      </ol>
    </Disclosure>
  )
}

const ROW =
  'grid gap-x-6 gap-y-1 px-4 py-3 sm:grid-cols-[8rem_minmax(0,1fr)_minmax(0,1fr)] print:grid-cols-[7rem_minmax(0,2fr)_minmax(0,4fr)] print:px-3 print:py-0.5'

type Props = {
  homeId: string
  facts: readonly FactHistoryShown[]
  /** a dated inspection says more than the fact of whether there ever was one */
  hasInspections: boolean
  mayEdit: boolean
}

/** What the register knows of the home, where each value is from, and what it was before. */
export function HomeFactsSection({ homeId, facts, hasInspections, mayEdit }: Props) {
  const shown = facts.filter(
    ({ kind, current }) => kind !== 'inspection-record' || (current !== null && !hasInspections),
  )
  const known = shown.filter(({ current }) => current !== null && current.value !== null).length
  return (
    <HomeSection
      id="facts"
      title="Facts"
      sub={`${known} of ${shown.length} known. Nothing is overwritten: what a fact was before stays with it.`}
      actions={
        mayEdit && (
          <ButtonLink href={`/homes/${homeId}/facts`} kind="secondary" size="compact">
            Correct facts
          </ButtonLink>
        )
      }
    >
      <dl className="divide-y divide-line border border-line bg-surface">
        {shown.map(({ kind, current, before }) => (
          <div key={kind} className={ROW}>
            <dt className="text-slate">{FACT_NAMES[kind]}</dt>
            <dd className="min-w-0">
              <Value fact={current} />
              <Earlier before={before} />
            </dd>
            <dd className="min-w-0">
              {current ? (
                <HomeProvenance {...current} />
              ) : (
                <span className="text-slate">Nothing on record</span>
              )}
            </dd>
          </div>
        ))}
      </dl>
    </HomeSection>
  )
}
