/** Homes that the demo must have on any day, whatever chance gave: a danger found this week, a fact put right, an odd address. */
import { addYears } from '@/lib/calendar/add-years'
import { type CalendarDay } from '@/lib/calendar/calendar-day'
import { type Fact, type FactKind } from '@/lib/homes/fact'
import { seededRandom } from '../seeded-random'
import { type DemoHome, type DemoInspection } from './demo-home'
import { draftOf } from './draft-of'
import { OBSERVATIONS, OFFICER_NOTES } from './observations'

type DaysAgo = (days: number) => CalendarDay
type Scene = (home: DemoHome, turn: number, daysAgo: DaysAgo) => DemoHome

const last = (home: DemoHome) => home.inspections.at(-1)
const foundOf = (home: DemoHome, kind: FactKind) =>
  last(home)?.facts.find((fact) => fact.kind === kind)?.value
const byOfficer = (kind: FactKind, value: string | null, on: CalendarDay, note: string): Fact => ({
  kind,
  value,
  source: 'officer',
  asOf: { day: on, precision: 'day' },
  note,
})

/** Danger found lately: the C1 is open, and so is what came with it. */
const danger: Scene = (home, turn, daysAgo) => {
  const on = daysAgo([1, 4, 9, 17, 33][turn] ?? 50)
  const report = last(home) as DemoInspection
  const facts = report.facts.map((fact) => ({ ...fact, asOf: { day: on, precision: 'day' as const } }))
  const c1 = OBSERVATIONS.filter(({ code }) => code === 'C1')[turn]
  const c2 = OBSERVATIONS.filter(({ code, boards }) => code === 'C2' && boards === null)[turn]
  const defects = [c1, c2].flatMap((one) =>
    one ? [{ code: one.code, description: one.description, location: one.location, closed: null }] : [],
  )
  const urgent: DemoInspection = {
    ...report,
    inspectedOn: { day: on, precision: 'day' },
    assessment: 'unsatisfactory',
    nextDueOn: addYears(on, 1),
    facts,
    defects,
  }
  return { ...home, inspections: [...home.inspections.slice(0, -1), urgent] }
}

/** The board was changed after the report, and an officer has seen the new one. */
const boardChanged: Scene = (home, turn, daysAgo) => {
  const on = daysAgo(12 + turn * 9)
  const note = 'Board changed by the repairs team; label and certificate seen at the visit'
  const facts = [
    byOfficer('board-type', 'rcbo', on, note),
    byOfficer('rcd-cover', 'all', on, note),
    byOfficer('ways', turn % 2 ? 'OOOOOOXX' : 'OOOOOOO', on, note),
  ]
  return { ...home, corrections: facts }
}

/** The report says one thing, and the officer who looked says another. */
const reportWasWrong: Scene = (home, turn, daysAgo) => {
  const on = daysAgo(20 + turn * 13)
  const facts = [
    byOfficer('board-type', 'mixed', on, 'Second board with two rewireable carriers found in the larder'),
    byOfficer('ways', 'RR[BBBB]', on, 'Counted on site, photographs taken'),
  ]
  return { ...home, corrections: facts }
}

/** Somebody went to look, and could not: it is known that it is not known. */
const lockedCupboard: Scene = (home, turn, daysAgo) => ({
  ...home,
  draft: { ...home.draft, boardType: 'unknown', rcdCover: 'unknown' },
  corrections: [
    byOfficer('board-type', null, daysAgo(30 + turn * 21), 'Meter cupboard locked, key not found'),
  ],
})

/** Stock list and officer disagree: neither is thrown away. */
const contradiction: Scene = (home, turn, daysAgo) => ({
  ...home,
  draft: { ...home.draft, boardType: 'breakers', rcdCover: 'all' },
  corrections: [
    byOfficer('ways', 'RRRRX', daysAgo(200 + turn * 40), 'Counted by torch through the cover; dusty'),
  ],
})

/** One way could not be seen. */
const oneWayUnseen: Scene = (home, turn, daysAgo) => ({
  ...home,
  corrections: [
    byOfficer('ways', turn % 2 ? 'RRRU' : 'RRRRU', daysAgo(60 + turn * 11), 'Last carrier painted over'),
  ],
})

/** A tenant told an officer, and nobody has been yet. */
const tenantTold: Scene = (home, turn, daysAgo) => {
  const { code, description, location } = OFFICER_NOTES[
    turn % OFFICER_NOTES.length
  ] as (typeof OFFICER_NOTES)[number]
  return {
    ...home,
    officerDefects: [{ code, description, location, closed: null, raisedOn: daysAgo(2 + turn * 5) }],
  }
}

const longAddress: Scene = (home) => ({
  ...home,
  draft: draftOf({
    ...home.draft,
    address:
      'First-floor rear flat, The Old Harbour Commissioners’ Weighing House and Tide Office, 31 Low Quay',
  }),
})

const isOld = (home: DemoHome) => foundOf(home, 'board-type') === 'rewireable'
const isDwelling = (home: DemoHome) => home.draft.kind === 'dwelling'
const isListOnly = (home: DemoHome) => home.inspections.length === 0

const SCENES: readonly (readonly [scene: Scene, times: number, fits: (home: DemoHome) => boolean])[] = [
  [danger, 5, (home) => isDwelling(home) && isOld(home)],
  [boardChanged, 24, isOld],
  [reportWasWrong, 5, (home) => foundOf(home, 'board-type') === 'breakers'],
  [lockedCupboard, 9, (home) => isListOnly(home) && home.draft.boardType === 'unknown'],
  [contradiction, 4, (home) => isListOnly(home) && home.draft.boardType === 'breakers'],
  [oneWayUnseen, 8, (home) => isListOnly(home) && home.draft.boardType === 'rewireable'],
  [tenantTold, 9, isDwelling],
  [longAddress, 1, (home) => isDwelling(home) && home.draft.address.endsWith('Low Quay')],
]

/** The homes with each scene played in as many of them as it says, spread over the town. */
export function scenes(homes: readonly DemoHome[], daysAgo: DaysAgo): DemoHome[] {
  const played = [...homes]
  const taken = new Set<number>()
  const order = seededRandom('scenes').shuffled(homes.map((_, at) => at))
  for (const [scene, times, fits] of SCENES) {
    const stage = order.filter((at) => !taken.has(at) && fits(played[at] as DemoHome)).slice(0, times)
    stage.forEach((at, turn) => {
      played[at] = scene(played[at] as DemoHome, turn, daysAgo)
      taken.add(at)
    })
  }
  return played
}
