import { type ReactNode } from 'react'
import { DueSketch } from '@/components/drawings/due-sketch'
import { RangeBar } from '@/components/drawings/range-bar'
import { ShareBar } from '@/components/drawings/share-bar'

/** Invented patches: homes with rewireable fuses, not known, in all. */
const PATCHES = [
  ['Ferry Bank', 214, 61, 520],
  ['Upper Fold', 97, 88, 610],
  ['Saltmarsh', 0, 9, 380],
] as const

const REASONS = [
  ['Average, house of 1920 to 1945', 'published'],
  ['Rewireable fuses', 'likelier'],
  ['No RCD', 'likelier'],
  ['Age of the wiring', 'not known'],
] as const

function Answer({
  question,
  children,
  drawing,
}: {
  question: string
  children: ReactNode
  drawing: ReactNode
}) {
  return (
    <div className="grid gap-x-12 gap-y-6 border-t border-line py-10 lg:grid-cols-[minmax(0,5fr)_minmax(0,6fr)] lg:py-14">
      <div>
        <h3 className="text-2xl sm:text-3xl">{question}</h3>
        <p className="mt-3 max-w-reading text-lg text-slate">{children}</p>
      </div>
      <div className="self-center">{drawing}</div>
    </div>
  )
}

function Patches() {
  return (
    <table className="w-full max-w-xl">
      <caption className="sr-only">Homes with rewireable fuses, by patch; invented figures</caption>
      <thead className="text-left text-sm text-slate">
        <tr>
          <th scope="col" className="pb-2 font-semibold">
            Patch
          </th>
          <th scope="col" className="pb-2 text-right font-semibold">
            Rewireable
          </th>
          <th scope="col" className="pb-2 pl-4 text-right font-semibold">
            Not known
          </th>
          <th scope="col" className="w-2/5 pb-2 pl-4 font-semibold max-sm:hidden">
            Of the patch
          </th>
        </tr>
      </thead>
      <tbody>
        {PATCHES.map(([patch, rewireable, unknown, total]) => (
          <tr key={patch} className="border-t border-line">
            <th scope="row" className="py-2.5 text-left font-normal">
              {patch}
            </th>
            <td className="py-2.5 text-right">{rewireable}</td>
            <td className="py-2.5 pl-4 text-right">{unknown}</td>
            <td className="py-2.5 pl-4 max-sm:hidden">
              <ShareBar rewireable={rewireable} unknown={unknown} total={total} />
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  )
}

function Score() {
  return (
    <div className="max-w-xl">
      <div className="flex flex-wrap items-center gap-x-8 gap-y-3">
        <p className="figures text-4xl font-semibold">3,120</p>
        <RangeBar score={3120} low={1400} high={5200} nation="england" size="card" />
      </div>
      <ul className="mt-4">
        {REASONS.map(([reason, why]) => (
          <li key={reason} className="flex justify-between gap-4 border-t border-line py-2">
            <span>{reason}</span>
            <span className="text-sm text-slate">{why}</span>
          </li>
        ))}
      </ul>
    </div>
  )
}

/** What the program does, as the questions that it answers, each beside the drawing that answers it. */
export function AnswersSection() {
  return (
    <section aria-labelledby="answers" className="mt-20 lg:mt-28">
      <h2 id="answers" className="sr-only">
        What it answers
      </h2>
      <Answer question="Which homes still have rewireable fuses?" drawing={<Patches />}>
        One click, patch by patch. The homes that nobody has looked at are counted apart, because not knowing
        is not the same as having none.
      </Answer>
      <Answer question="Whose report lapses next?" drawing={<DueSketch />}>
        Every week of the past and the year to come on one line. Each date names the law that sets it, for the
        nation that the home stands in.
      </Answer>
      <Answer question="Which home first, and why?" drawing={<Score />}>
        A score by the published hazard-rating formula, with every reason in sight: what is published, what is
        our judgement, and how far the number could move with what is not yet known.
      </Answer>
    </section>
  )
}
