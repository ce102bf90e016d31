import { Card } from '@/components/ui/card'
import { StatusLine } from '@/components/ui/status-line'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type FormAction } from '@/lib/forms/form-state'
import { HomeBoardCard } from './home-board-card'
import { HomeDefectsCard } from './home-defects-card'
import { HomeFactsSection } from './home-facts-section'
import { HomeHeader } from './home-header'
import { HomeInspectionsSection } from './home-inspections-section'
import { HomePlaceCard } from './home-place-card'
import { HomeScoreCard } from './home-score-card'
import { HomeScoreHistory } from './home-score-history'
import { type HomeShown } from './home-shown'
import { HomeStandingCard } from './home-standing-card'

type Props = {
  shown: HomeShown
  today: CalendarDay
  /** what has just been done, to be said once */
  said: string | null
  closeDefect: FormAction
}

/** One home: who and where, what is on the wall, why it ranks where it does, how it stands, and its record. */
export function HomeScreen({ shown, today, said, closeDefect }: Props) {
  const { home, note, standing, facts, inspections, openDefects, closedDefects, assessment, rank, mayEdit } =
    shown
  return (
    <div className="print:[zoom:0.72]">
      <HomeHeader home={home} isOwed={standing.isOwed} mayEdit={mayEdit} today={today} />
      {said && (
        <div className="no-print mb-4">
          <StatusLine>{said}</StatusLine>
        </div>
      )}
      <div className="grid items-start gap-4 lg:grid-cols-[minmax(0,5fr)_minmax(0,4fr)] lg:grid-rows-[auto_auto_1fr] lg:gap-5 print:grid-cols-[minmax(0,5fr)_minmax(0,4fr)] print:grid-rows-[auto_auto_1fr] print:gap-2">
        <HomeBoardCard
          home={home}
          facts={facts}
          neighbours={shown.neighbours}
          mayEdit={mayEdit}
          className="print:p-3"
        />
        <HomeScoreCard
          home={home}
          assessment={assessment}
          rank={rank}
          className="lg:col-start-2 lg:row-span-3 lg:row-start-1 print:col-start-2 print:row-span-3 print:row-start-1 print:p-3"
        />
        <HomeStandingCard home={home} standing={standing} today={today} className="print:p-3" />
        <HomeDefectsCard
          homeId={home.id}
          open={openDefects}
          closed={closedDefects}
          mayEdit={mayEdit}
          today={today}
          closeDefect={closeDefect}
          className="print:p-3"
        />
      </div>
      <div className="mt-10 space-y-10 print:mt-3 print:space-y-3">
        <HomeFactsSection
          homeId={home.id}
          facts={facts}
          hasInspections={inspections.length > 0}
          mayEdit={mayEdit}
        />
        <HomeInspectionsSection
          homeId={home.id}
          inspections={inspections}
          neverInspected={home.inspectionRecord === 'never'}
          mayEdit={mayEdit}
        />
        <div className="grid items-start gap-x-5 gap-y-10 lg:grid-cols-[minmax(0,5fr)_minmax(0,4fr)] print:block">
          <HomeScoreHistory history={shown.scoreHistory} nation={home.nation} />
          <div className="space-y-4 lg:space-y-5">
            <Card id="note" title="Note" className={note ? 'print:p-3' : 'print:hidden'}>
              {note ? (
                <p className="max-w-reading whitespace-pre-line">{note}</p>
              ) : (
                <p className="text-slate">
                  No note. One can come with an import, or with “Change address and tenure”.
                </p>
              )}
            </Card>
            <HomePlaceCard place={home.place} />
          </div>
        </div>
      </div>
    </div>
  )
}
