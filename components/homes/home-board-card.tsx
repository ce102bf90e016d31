import Link from 'next/link'
import { BoardStrip } from '@/components/drawings/board-strip'
import { ShareBar } from '@/components/drawings/share-bar'
import { ButtonLink } from '@/components/ui/button-link'
import { Card } from '@/components/ui/card'
import { boardInWords } from '@/lib/electrical/board-in-words'
import { FACT_NAMES, type FactKind, type FactSource } from '@/lib/homes/fact'
import { type HomeRow } from '@/lib/homes/home-row'
import { dateWithPrecision } from './home-provenance'
import { type FactHistoryShown, type NeighboursShown } from './home-shown'
import { countOf, whole } from './home-words'

const FROM: Record<FactSource, string> = {
  inspection: 'an inspection',
  import: 'an imported list',
  officer: 'an officer',
  inferred: 'what is likely for it',
}

const SHOWN: readonly FactKind[] = ['board-type', 'ways', 'rcd-cover']

/** Where each part of the drawing is from; parts of one source and date are told together. */
function provenance(facts: readonly FactHistoryShown[]): readonly string[] {
  const told = new Map<string, string[]>()
  for (const kind of SHOWN) {
    const fact = facts.find((one) => one.kind === kind)?.current
    if (!fact || fact.value === null) continue
    const from = `${FROM[fact.source]}, ${dateWithPrecision(fact.asOf)}`
    told.set(from, [...(told.get(from) ?? []), FACT_NAMES[kind]])
  }
  if (told.size === 1) return [`From ${[...told.keys()].join('')}.`]
  return [...told].map(([from, kinds]) => `${kinds.join(' and ')}: ${from}.`)
}

function Neighbours({
  block,
  neighbours,
}: {
  block: { id: string; name: string }
  neighbours: NeighboursShown
}) {
  const { homes, withRewireableWays, unknown, lapsed } = neighbours
  if (homes === 0) return null
  return (
    <div className="mt-5 border-t border-line pt-4 print:hidden">
      <h3 className="text-base">
        The other {countOf(homes, 'home')} of{' '}
        <Link href={`/homes?block=${block.id}`} className="link">
          {block.name}
        </Link>
      </h3>
      <div className="mt-2 max-w-md">
        <ShareBar rewireable={withRewireableWays} unknown={unknown} total={homes} />
      </div>
      <p className="mt-1.5 text-sm text-slate">
        {whole(withRewireableWays)} with rewireable fuses, {whole(unknown)} whose board is not known,{' '}
        {whole(homes - withRewireableWays - unknown)} with others; {whole(lapsed)} lapsed. A block was often
        wired at one time.
      </p>
    </div>
  )
}

type Props = {
  home: HomeRow
  facts: readonly FactHistoryShown[]
  neighbours: NeighboursShown | null
  mayEdit: boolean
  className?: string
}

/** What is on the wall: drawn way by way, said in words, with where that is from. */
export function HomeBoardCard({ home, facts, neighbours, mayEdit, className }: Props) {
  const words = boardInWords(home)
  const from = provenance(facts)
  return (
    <Card id="board" title="Consumer unit" sub={`${words}.`} className={className}>
      <div className="py-1 print:max-w-56">
        <BoardStrip
          ways={home.ways}
          boardType={home.boardType}
          rcdCover={home.rcdCover}
          size="full"
          decorative
        />
      </div>
      {from.length > 0 ? (
        from.map((sentence) => (
          <p key={sentence} className="mt-2 text-sm text-slate">
            {sentence}
          </p>
        ))
      ) : (
        <div className="mt-3">
          <p className="text-blueprint">
            Nobody has told the register what is on the wall. The last report says it; so does a look behind
            the flap, without removing any cover.
          </p>
          {mayEdit && (
            <ButtonLink
              href={`/homes/${home.id}/facts#board`}
              kind="secondary"
              size="compact"
              className="mt-3"
            >
              Say what is there
            </ButtonLink>
          )}
        </div>
      )}
      {home.block && neighbours && <Neighbours block={home.block} neighbours={neighbours} />}
    </Card>
  )
}
