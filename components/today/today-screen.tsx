import Link from 'next/link'
import { BoardStrip } from '@/components/drawings/board-strip'
import { CodeBadge } from '@/components/drawings/code-badge'
import { DueLine } from '@/components/drawings/due-line'
import { type DueLineWeek } from '@/components/drawings/due-line-weeks'
import { RewireableByPatch } from '@/components/homes/rewireable-by-patch'
import { ButtonLink } from '@/components/ui/button-link'
import { PageHeader } from '@/components/ui/page-header'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { dayInWords } from '@/lib/calendar/day-in-words'
import { type HomeRow } from '@/lib/homes/home-row'
import { type Standing } from '@/lib/homes/standing'
import { FirstStep } from './first-step'
import { HomeCard } from './home-card'

type Props = {
  today: CalendarDay
  shown: {
    readonly homes: number
    readonly standing: Readonly<Record<Standing, number>> & {
      readonly homes: number
      readonly notOwed: number
    }
    readonly noticeDays: number
    readonly weeks: readonly DueLineWeek[]
    readonly danger: {
      readonly withC1: number
      readonly withC2: number
      readonly worstC1: readonly HomeRow[]
      readonly oldestC2: readonly { readonly home: HomeRow; readonly raisedOn: CalendarDay | null }[]
    }
    readonly rewireable: {
      readonly patches: Parameters<typeof RewireableByPatch>[0]['patches']
      readonly unknown: number
    }
    readonly worst: readonly HomeRow[]
    readonly firstStep: 'import' | 'ask-a-manager' | 'ask-for-a-patch' | null
  }
}

const whole = (n: number) => n.toLocaleString('en-GB')
const homes = (n: number) => `${whole(n)} ${n === 1 ? 'home' : 'homes'}`

function headline({ standing }: Props['shown']): string {
  const without = standing.lapsed + standing['never inspected'] + standing['unknown date']
  if (without === 0) return 'Every home has a report in date'
  return `${homes(without)} ${without === 1 ? 'has' : 'have'} no report in date`
}

function subline({ standing, noticeDays }: Props['shown']): string {
  const parts = [`Of ${homes(standing.homes)}: ${whole(standing.lapsed)} lapsed`]
  if (standing['never inspected']) parts.push(`${whole(standing['never inspected'])} never inspected`)
  if (standing['unknown date']) parts.push(`${whole(standing['unknown date'])} of unknown date`)
  const leased = standing.notOwed ? ` ${homes(standing.notOwed)} on long leases are left aside.` : ''
  return `${parts.join(', ')}. Another ${whole(standing.due)} lapse within ${noticeDays} days.${leased}`
}

/** What must be done now: what lapses when, what is dangerous, which homes first. */
export function TodayScreen({ today, shown }: Props) {
  if (shown.firstStep) return <FirstStep step={shown.firstStep} />
  const { danger, rewireable, standing } = shown
  return (
    <>
      <PageHeader
        title={headline(shown)}
        sub={subline(shown)}
        actions={
          <>
            <ButtonLink href="/homes?board=rewireable-ways" kind="secondary">
              Homes with rewireable fuses
            </ButtonLink>
            <ButtonLink href="/homes">Which first</ButtonLink>
          </>
        }
      />
      <DueLine weeks={shown.weeks} today={today} />
      <div className="mt-8 grid gap-x-8 gap-y-10 lg:grid-cols-2">
        <section aria-labelledby="danger">
          <h2 id="danger" className="text-xl">
            Danger present
          </h2>
          <p className="mb-3 text-slate">
            {danger.withC1 === 0
              ? 'No C1 is open.'
              : `${homes(danger.withC1)} with an open C1: make safe at once, then put right.`}
          </p>
          <ul className="space-y-2">
            {danger.worstC1.slice(0, 5).map((home) => (
              <HomeCard
                key={home.id}
                home={home}
                tone="madder"
                aside={<CodeBadge code="C1" count={home.open.C1} plain />}
              >
                <BoardStrip
                  ways={home.ways}
                  boardType={home.boardType}
                  rcdCover={home.rcdCover}
                  size="list"
                />
              </HomeCard>
            ))}
          </ul>
          {danger.withC1 > 5 && (
            <More href="/homes?defects=C1">All {homes(danger.withC1)} with an open C1</More>
          )}
          <h3 className="mt-6 mb-3 text-lg">Potentially dangerous, open longest</h3>
          {danger.oldestC2.length === 0 && <p className="text-slate">No C2 is open.</p>}
          <ul className="space-y-2">
            {danger.oldestC2.map(({ home, raisedOn }) => (
              <HomeCard
                key={home.id}
                home={home}
                tone="amber"
                aside={<CodeBadge code="C2" count={home.open.C2} plain />}
              >
                {raisedOn ? `Found ${dayInWords(raisedOn)}` : 'Found on a day not known'}
              </HomeCard>
            ))}
          </ul>
          {danger.withC2 > danger.oldestC2.length && (
            <More href="/homes?defects=C2">All {homes(danger.withC2)} with an open C2</More>
          )}
        </section>
        <div className="min-w-0 space-y-10">
          <section aria-labelledby="fuses">
            <h2 id="fuses" className="mb-3 text-xl">
              Still on rewireable fuses
            </h2>
            <RewireableByPatch patches={rewireable.patches} />
          </section>
          <section aria-labelledby="first">
            <h2 id="first" className="mb-3 text-xl">
              Which first
            </h2>
            <ol className="space-y-2">
              {shown.worst.slice(0, 6).map((home) => (
                <HomeCard
                  key={home.id}
                  home={home}
                  aside={<span className="figures font-semibold">{whole(Math.round(home.score))}</span>}
                >
                  <BoardStrip
                    ways={home.ways}
                    boardType={home.boardType}
                    rcdCover={home.rcdCover}
                    size="list"
                  />
                </HomeCard>
              ))}
            </ol>
            <More href="/homes">The whole ranking</More>
          </section>
          <section aria-labelledby="stuck">
            <h2 id="stuck" className="mb-2 text-xl">
              Stuck for want of a fact
            </h2>
            <ul className="space-y-1">
              <Stuck
                href="/homes?standing=never+inspected&duty=owed"
                count={standing['never inspected']}
                words="never inspected"
              />
              <Stuck
                href="/homes?standing=unknown+date&duty=owed"
                count={standing['unknown date']}
                words="with an inspection of unknown date"
              />
              <Stuck
                href="/homes?board=unknown"
                count={rewireable.unknown}
                words="where nobody knows what is on the wall"
              />
            </ul>
          </section>
        </div>
      </div>
    </>
  )
}

function More({ href, children }: { href: string; children: React.ReactNode }) {
  return (
    <p className="mt-3">
      <Link href={href} className="link-block link">
        {children}
      </Link>
    </p>
  )
}

function Stuck({ href, count, words }: { href: string; count: number; words: string }) {
  return (
    <li>
      {count === 0 ? (
        <span className="text-slate">No home {words}</span>
      ) : (
        <Link href={href} className="link-block link">
          {homes(count)} {words}
        </Link>
      )}
    </li>
  )
}
