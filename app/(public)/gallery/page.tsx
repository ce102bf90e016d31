import { BoardStrip } from '@/components/drawings/board-strip'
import { ClockRing } from '@/components/drawings/clock-ring'
import { CodeBadge } from '@/components/drawings/code-badge'
import { DueLine } from '@/components/drawings/due-line'
import { Figure } from '@/components/drawings/figure'
import { RangeBar } from '@/components/drawings/range-bar'
import { ShareBar } from '@/components/drawings/share-bar'
import { StandingBadge } from '@/components/drawings/standing-badge'
import { GalleryForm } from '@/components/ui/gallery-form'
import { OrganisationMenu } from '@/components/shell/organisation-menu'
import { QueryProvider } from '@/components/shell/query-provider'
import { TopBar } from '@/components/shell/top-bar'
import { Badge } from '@/components/ui/badge'
import { Breadcrumb } from '@/components/ui/breadcrumb'
import { Button } from '@/components/ui/button'
import { ButtonLink } from '@/components/ui/button-link'
import { Card } from '@/components/ui/card'
import { DefinitionList } from '@/components/ui/definition-list'
import { Dialog } from '@/components/ui/dialog'
import { EmptyState } from '@/components/ui/empty-state'
import { ChipLink, FilterChip } from '@/components/ui/filter-chip'
import { Notice } from '@/components/ui/notice'
import { PageHeader } from '@/components/ui/page-header'
import { Pagination } from '@/components/ui/pagination'
import { Popover } from '@/components/ui/popover'
import { Progress } from '@/components/ui/progress'
import { SegmentedLinks } from '@/components/ui/segmented-links'
import { TabLinks } from '@/components/ui/tab-links'
import { Cell, HeadCell, Row, RowHead, Table } from '@/components/ui/table'
import { calendarDay } from '@/lib/calendar/calendar-day'
import { addDays } from '@/lib/calendar/add-days'
import { dueWeeks } from '@/lib/duties/due-weeks'

const today = calendarDay('2026-12-01')
const weeks = dueWeeks(
  Array.from({ length: 460 }, (_, i) => ({ day: addDays(today, i - 90), homes: Math.round(4 + 3 * Math.sin(i / 23) + ((i * 7) % 5)) })),
  today,
  { weeksBack: 13, weeksOn: 52 },
)
const homes = [
  ['14 Capstan Row', 'RRRRRU', 'rewireable', 'none', 'lapsed', '2021-03-14', 3120, 1400, 5200],
  ['27 Tannery Lane', 'RRRRX', 'rewireable', 'none', 'lapsed', '2025-06-14', 1480, 1400, 1600],
  ['Flat 3, Osprey Court', null, 'unknown', 'unknown', 'unknown date', null, 910, 120, 3000],
  ['8 Quarry Steps', 'RR[BBB]X', 'mixed', 'part', 'due', '2026-12-18', 640, 500, 700],
  ['5 Heron Way', 'CCCCCX', 'cartridge', 'none', 'never inspected', null, 410, 300, 500],
  ['41 Tannery Lane', '[BBBB]BB', 'breakers', 'sockets', 'in date', '2028-08-02', 88, 60, 120],
  ['19 Sandpiper Close', 'OOOOOO', 'rcbo', 'all', 'in date', '2029-05-02', 14, 10, 20],
  ['20 Sandpiper Close', null, 'rewireable', 'none', 'in date', '2029-05-02', 14, 10, 20],
  ['21 Sandpiper Close', null, 'breakers', 'all', 'in date', '2029-05-02', 14, 10, 20],
  ['22 Sandpiper Close', null, 'mixed', 'part', 'in date', '2029-05-02', 14, 10, 20],
  ['Long', '[BBBBBBBB][BBBBBBOO]UXX', 'breakers', 'all', 'in date', '2029-05-02', 0.4, 0.1, 2],
] as const
const actor = {
  personId: '1', name: 'Ada Holm', email: 'a@b.example', organisationId: '1', organisationName: 'Marsh End Homes', role: 'manager', patches: 'all',
} as const
async function nothing() { 'use server' }
async function nothingForm(_: FormData) { 'use server' }

export default function Gallery() {
  return (
    <QueryProvider>
      <TopBar actor={actor} others={[{ organisationId: '2', name: 'Holm Lettings' }]} onSwitch={nothingForm} onSignOut={nothing} />
      <PageHeader above={<Breadcrumb steps={[{ href: '/homes', label: 'Homes' }]} here="Ferry Bank" />} title="311 homes have no report in date" sub="1 in 8 of 2,412. Another 96 lapse before the end of January; 61 of those are not booked." actions={<><ButtonLink href="/x" kind="secondary">Export what is shown</ButtonLink><Button>Add a home</Button><Button kind="danger">End access</Button><Button kind="quiet">Quiet</Button><Button disabled>Off</Button></>}>
        <Badge tone="madder">Lapsed 14 March 2021</Badge><Badge tone="amber">Due</Badge><Badge tone="verdigris">In date</Badge><Badge tone="blueprint">Unknown date</Badge><Badge tone="plain">Void</Badge>
        <CodeBadge code="C1" /><CodeBadge code="C2" count={2} /><CodeBadge code="C3" /><CodeBadge code="FI" /><CodeBadge code="FI" plain />
      </PageHeader>
      <DueLine weeks={weeks} today={today} />
      <div className="my-4 flex flex-wrap gap-2"><FilterChip href="/x">Rewireable fuses</FilterChip><Popover trigger="Patch" label="Patch">Hello</Popover><ChipLink href="/x" active={false}>Lapsed</ChipLink><Dialog trigger="Correct" title="Correct the board" description="The old fact stays in the history.">{<p>body</p>}</Dialog>
      <OrganisationMenu organisationName="Marsh End Homes" personName="Ada" roleName="Manager" places={[{href:'/imports',label:'Imports'}]} others={[]} onSwitch={nothingForm} onSignOut={nothing} /></div>
      <SegmentedLinks label="View" segments={[{ href: '/a', label: 'List', current: true, count: 352 }, { href: '/b', label: 'Map', current: false }]} />
      <Table caption="Homes" className="min-w-[56rem]">
        <thead><tr><HeadCell>Home</HeadCell><HeadCell>Consumer unit</HeadCell><HeadCell>Standing</HeadCell><HeadCell numeric sorted="descending">Score</HeadCell><HeadCell>Range</HeadCell></tr></thead>
        <tbody>
          {homes.map(([address, ways, boardType, rcdCover, standing, due, score, low, high]) => (
            <Row key={address}><RowHead>{address}<span className="block text-sm font-normal text-slate">Ferry Bank</span></RowHead><Cell><BoardStrip ways={ways} boardType={boardType} rcdCover={rcdCover} /></Cell><Cell><StandingBadge standing={standing} dueOn={due ? calendarDay(due) : null} today={today} /></Cell><Cell numeric className="figures font-semibold">{score.toLocaleString('en-GB')}</Cell><Cell><RangeBar score={score} low={low} high={high} nation="england" /></Cell></Row>
          ))}
        </tbody>
      </Table>
      <Pagination label="homes" firstHref="/a" nextHref="/b">1 to 50 of 2,412</Pagination>
      <TabLinks label="Parts" tabs={[{ href: '/a', label: 'Columns', current: true }, { href: '/b', label: 'Problems', current: false, count: 12 }]} />
      <div className="my-6 grid gap-6 lg:grid-cols-2">
        <Card title="Consumer unit" sub="From the inspection of 14 March 2016." id="cu">
          <div className="space-y-6">
            {homes.map(([address, ways, boardType, rcdCover]) => <BoardStrip key={address} ways={ways} boardType={boardType} rcdCover={rcdCover} size="full" />)}
            {homes.slice(0, 4).map(([address, ways, boardType, rcdCover]) => <BoardStrip key={address} ways={ways} boardType={boardType} rcdCover={rcdCover} size="card" />)}
          </div>
        </Card>
        <Card title="Why it ranks 1st of 2,412">
          <RangeBar score={3120} low={1400} high={5200} nation="england" size="card" />
          <RangeBar score={312} low={100} high={800} nation="wales" size="card" />
          <RangeBar score={0.5} low={0.1} high={2} nation="scotland" size="card" />
          <DefinitionList items={[{ term: 'Built', value: '1931', note: 'stock-list.xlsx, row 14' }, { term: 'UPRN', value: <span className="figures">100099004121</span> }]} />
          <div className="flex gap-8 py-4"><Figure value={2412} label="homes" href="/homes" /><Figure value={311} label="lapsed" tone="madder" /></div>
          <ShareBar rewireable={214} unknown={61} total={500} />
          <div className="flex gap-2 py-3"><ClockRing left={0.2} tone="madder" /><ClockRing left={0.7} tone="amber" /></div>
          <Progress label="Reading the file" done={4210} total={12000} unit="rows" />
          <div className="space-y-3 py-4"><Notice tone="plain" title="Find out next: size of the main tails">It would narrow the range.</Notice><Notice tone="madder" title="Could not read">x</Notice><Notice tone="amber">amber</Notice><Notice tone="verdigris">Saved.</Notice><Notice>Info</Notice></div>
        </Card>
      </div>
      <EmptyState title="No homes yet" actions={<ButtonLink href="/imports">Hand in a list</ButtonLink>} drawing={<BoardStrip ways={null} boardType="unknown" rcdCover="unknown" size="card" decorative />}>Hand in the list you have.</EmptyState>
      <GalleryForm />
    </QueryProvider>
  )
}
