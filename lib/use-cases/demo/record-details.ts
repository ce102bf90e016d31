import { type WritingScope } from '@/db/connection'
import * as defects from '@/db/repositories/defects'
import * as homeFacts from '@/db/repositories/home-facts'
import * as inspections from '@/db/repositories/inspections'
import { type DemoDefect, type DemoHome } from '@/db/seeds/portfolio/demo-home'
import { type Fact } from '@/lib/homes/fact'
import { newId } from '@/lib/platform/new-id'

/** A home of the demo that is in the register. */
export type PlacedHome = { readonly homeId: string; readonly home: DemoHome }

/** Who handed in the reports, and who went to look. */
export type Recorders = { readonly firm: string; readonly officer: string }

type Layer = readonly { readonly homeId: string; readonly facts: readonly Fact[] }[]

/** Adds to homes of the register what reports and officers have said of them, the oldest first. */
export async function recordDetails(
  scope: WritingScope,
  homes: readonly PlacedHome[],
  by: Recorders,
): Promise<void> {
  await recordReports(scope, homes, by.firm)
  await recordOfficerDefects(scope, homes, by.officer)
  const current = new Map(
    (
      await homeFacts.listCurrent(
        scope,
        homes.map(({ homeId }) => homeId),
      )
    ).map((fact) => [`${fact.homeId} ${fact.kind}`, fact.id]),
  )
  const depth = Math.max(0, ...homes.map(({ home }) => home.inspections.length))
  for (let turn = 0; turn < depth; turn += 1)
    await recordFacts(
      scope,
      homes.map(({ homeId, home }) => ({ homeId, facts: home.inspections[turn]?.facts ?? [] })),
      current,
      by.firm,
    )
  await recordFacts(
    scope,
    homes.map(({ homeId, home }) => ({ homeId, facts: home.corrections })),
    current,
    by.officer,
  )
}

/** Puts facts in the place of those that are current, which become history. */
async function recordFacts(
  scope: WritingScope,
  layer: Layer,
  current: Map<string, string>,
  by: string,
): Promise<void> {
  const fresh = layer.flatMap(({ homeId, facts }) =>
    facts.map((fact) => ({ ...fact, homeId, id: newId(), recordedBy: by })),
  )
  const replaced = fresh.flatMap(({ homeId, kind }) => {
    const id = current.get(`${homeId} ${kind}`)
    return id === undefined ? [] : [{ homeId, id }]
  })
  await homeFacts.supersede(scope, replaced)
  await homeFacts.insertMany(scope, fresh)
  for (const { homeId, kind, id } of fresh) current.set(`${homeId} ${kind}`, id)
}

async function recordReports(scope: WritingScope, homes: readonly PlacedHome[], by: string): Promise<void> {
  const reports = homes.flatMap(({ homeId, home }) =>
    home.inspections.map((report) => ({
      ...report,
      homeId,
      id: newId(),
      source: 'inspection' as const,
      recordedBy: by,
    })),
  )
  await inspections.insertMany(scope, reports)
  const found = reports.flatMap((report) =>
    report.defects.map((defect) => ({
      defect,
      row: newDefect(report.homeId, defect, {
        inspectionId: report.id,
        raisedOn: report.inspectedOn,
        recordedBy: by,
      }),
    })),
  )
  await defects.insertMany(
    scope,
    found.map(({ row }) => row),
  )
  for (const { defect, row } of found)
    if (defect.closed) await defects.close(scope, [row], { ...defect.closed, by })
}

async function recordOfficerDefects(
  scope: WritingScope,
  homes: readonly PlacedHome[],
  by: string,
): Promise<void> {
  await defects.insertMany(
    scope,
    homes.flatMap(({ homeId, home }) =>
      home.officerDefects.map((defect) => ({
        ...newDefect(homeId, defect, {
          inspectionId: null,
          raisedOn: { day: defect.raisedOn, precision: 'day' },
          recordedBy: by,
        }),
        source: 'officer' as const,
      })),
    ),
  )
}

const newDefect = (
  homeId: string,
  { code, description, location }: DemoDefect,
  rest: Pick<defects.NewDefect, 'inspectionId' | 'raisedOn' | 'recordedBy'>,
): defects.NewDefect => ({ id: newId(), homeId, code, description, location, source: 'inspection', ...rest })
