/** A home and its row in the register, straight into the database, with as much known as the test says. */
import { addressSortOf, searchTextOf } from '@/db/repositories/home-register-search'
import { inTransaction } from '@/db/connection'
import { type BoardType } from '@/lib/homes/board-type'
import { type Nation } from '@/lib/homes/nation'
import { type RcdCover } from '@/lib/homes/rcd-cover'
import { type InspectionRecord } from '@/lib/homes/standing'
import { type Tenure } from '@/lib/homes/tenure'
import { newId } from '@/lib/platform/new-id'

export type AHome = {
  kind?: 'dwelling' | 'communal'
  patchId?: string | null
  blockId?: string | null
  reference?: string | null
  uprn?: string | null
  address?: string
  postcode?: string | null
  nation?: Nation
  tenure?: Tenure
  boardType?: BoardType
  rcdCover?: RcdCover
  inspectionRecord?: InspectionRecord
  inspectedOn?: string | null
  dueOn?: string | null
  openC1?: number
  openC2?: number
  score?: number
  latitude?: number | null
  longitude?: number | null
}

let made = 0

/**
 * Nothing is known of it but its address, unless the test says so.
 * @returns the home's identifier
 * @example const homeId = await aHome(manager, { patchId: patches.north, boardType: 'rewireable', score: 900 })
 */
export async function aHome(owner: { organisationId: string }, given: AHome = {}): Promise<string> {
  made += 1
  const id = newId()
  const address = given.address ?? `${made} Lantern Row`
  const postcode = given.postcode === undefined ? 'ZX1 1AA' : given.postcode
  const key = `${address} ${postcode ?? ''}`.toLowerCase().trim()
  const score = given.score ?? 100
  const shared = {
    kind: given.kind ?? 'dwelling',
    patch_id: given.patchId ?? null,
    block_id: given.blockId ?? null,
    nation: given.nation ?? 'england',
    tenure: given.tenure ?? 'social-rent',
    latitude: given.latitude ?? null,
    longitude: given.longitude ?? null,
  }
  await inTransaction(owner, async ({ db, organisationId }) => {
    await db('homes').insert({
      ...shared,
      organisation_id: organisationId,
      id,
      reference: given.reference ?? null,
      uprn: given.uprn ?? null,
      address,
      town: 'Saltmarrow',
      postcode,
      address_key: key,
    })
    await db('home_register').insert({
      ...shared,
      organisation_id: organisationId,
      home_id: id,
      address_sort: addressSortOf(address, 'Saltmarrow'),
      search_text: searchTextOf({
        address,
        town: 'Saltmarrow',
        postcode,
        uprn: given.uprn === undefined ? null : String(given.uprn),
        reference: given.reference ?? null,
      }),
      board_type: given.boardType ?? 'unknown',
      rcd_cover: given.rcdCover ?? 'unknown',
      wiring: 'unknown',
      dwelling_type: 'unknown',
      inspection_record: given.inspectionRecord ?? (given.inspectedOn ? 'dated' : 'unknown'),
      inspected_on: given.inspectedOn ?? null,
      inspected_precision: given.inspectedOn ? 'day' : null,
      due_on: given.dueOn ?? null,
      open_c1: given.openC1 ?? 0,
      open_c2: given.openC2 ?? 0,
      score,
      score_low: score,
      score_high: score,
    })
  })
  return id
}
