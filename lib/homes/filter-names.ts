/** The filters of the homes list: what each is called, what it can be, and which are on. */
import { BOARD_FILTERS, DUTIES, homeQueryText, type HomeQuery } from './home-query'
import { BOARD_TYPE_NAMES } from './board-type'
import { NATION_NAMES, NATIONS } from './nation'
import { RCD_COVER_NAMES, RCD_COVERS } from './rcd-cover'
import { STANDINGS } from './standing'
import { TENURE_NAMES, TENURES } from './tenure'

export type ListFilter =
  'patch' | 'block' | 'board' | 'cover' | 'standing' | 'tenure' | 'nation' | 'duty' | 'defects'
export type FilterChoice = { readonly value: string; readonly label: string; readonly homes?: number }

export const FILTER_NAMES: Record<ListFilter, string> = {
  board: 'Consumer unit',
  patch: 'Patch',
  standing: 'Standing',
  cover: 'RCD cover',
  defects: 'Open defects',
  tenure: 'Tenure',
  block: 'Block',
  nation: 'Nation',
  duty: 'Inspection',
}

const firstUpper = (text: string) => text.replace(/^./, (letter) => letter.toUpperCase())

/** The choices of the filters that are the same for everybody. */
export const FIXED_CHOICES: Record<Exclude<ListFilter, 'patch' | 'block'>, readonly FilterChoice[]> = {
  board: BOARD_FILTERS.map((value) => ({
    value,
    label:
      value === 'rewireable-ways'
        ? 'Any rewireable fuses'
        : value === 'rewireable'
          ? 'Rewireable fuses only'
          : BOARD_TYPE_NAMES[value],
  })),
  cover: RCD_COVERS.map((value) => ({ value, label: RCD_COVER_NAMES[value] })),
  standing: STANDINGS.map((value) => ({ value, label: firstUpper(value) })),
  defects: [
    { value: 'any', label: 'Any open defect' },
    { value: 'C1', label: 'Open C1' },
    { value: 'C2', label: 'Open C2' },
    { value: 'FI', label: 'Open FI' },
    { value: 'C3', label: 'Open C3' },
  ],
  tenure: TENURES.map((value) => ({ value, label: TENURE_NAMES[value] })),
  nation: NATIONS.map((value) => ({ value, label: NATION_NAMES[value] })),
  duty: DUTIES.map((value) => ({
    value,
    label: value === 'owed' ? 'Owed by the landlord' : 'Not owed: on a long lease',
  })),
}

type Place = { readonly id: string; readonly name: string; readonly homes: number }

/** The choices of the filters that are an organisation's own: its patches, "in no patch", and its blocks. */
export function placeChoices(found: {
  readonly patches: readonly Place[]
  readonly inNoPatch: number
  readonly blocks: readonly Place[]
}): { patches: FilterChoice[]; blocks: FilterChoice[] } {
  const asChoice = ({ id, name, homes }: Place): FilterChoice => ({ value: id, label: name, homes })
  const noPatch = { value: 'none', label: 'In no patch', homes: found.inNoPatch }
  const patches = found.patches.map(asChoice)
  return {
    patches: found.inNoPatch > 0 ? [...patches, noPatch] : patches,
    blocks: found.blocks.map(asChoice),
  }
}

/**
 * The address of the list for a query; a changed query starts at its first page.
 * @example listAddress({ ...homeQueryOf({}), search: 'quay' }) // '/homes?search=quay'
 */
export function listAddress(query: HomeQuery, change: Partial<HomeQuery> = {}, path = '/homes'): string {
  const text = homeQueryText({ ...query, after: undefined, ...change })
  return text ? `${path}?${text}` : path
}

export type FilterOn = { readonly key: string; readonly label: string; readonly off: Partial<HomeQuery> }

/** Every filter that is on, with the change of the query that takes it off. */
export function filtersOn(
  query: HomeQuery,
  choices: Readonly<Record<ListFilter, readonly FilterChoice[]>>,
): FilterOn[] {
  const on: FilterOn[] = []
  for (const filter of Object.keys(FILTER_NAMES) as ListFilter[]) {
    const values: readonly string[] = query[filter]
    for (const value of values) {
      const label =
        choices[filter].find((choice) => choice.value === value)?.label ?? 'something that is gone'
      on.push({
        key: `${filter} ${value}`,
        label: `${FILTER_NAMES[filter]}: ${label}`,
        off: { [filter]: values.filter((other) => other !== value) },
      })
    }
  }
  if (query.search) on.push({ key: 'search', label: `“${query.search}”`, off: { search: '' } })
  if (query.builtFrom !== undefined || query.builtTo !== undefined)
    on.push({
      key: 'built',
      label: `Built ${query.builtFrom ?? 'any year'} to ${query.builtTo ?? 'now'}`,
      off: { builtFrom: undefined, builtTo: undefined },
    })
  if (query.dueFrom !== undefined || query.dueTo !== undefined)
    on.push({
      key: 'due',
      label: `Report ends ${query.dueFrom ?? 'any day'} to ${query.dueTo ?? 'any day'}`,
      off: { dueFrom: undefined, dueTo: undefined },
    })
  if (query.within) on.push({ key: 'within', label: 'Within an area of the map', off: { within: undefined } })
  return on
}
