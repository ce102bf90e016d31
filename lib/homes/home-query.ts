/** What a person asks of the homes list: filter, search, order, columns. The URL holds it; this reads and writes it. */
import { z } from 'zod'
import { BOARD_TYPES } from './board-type'
import { NATIONS } from './nation'
import { RCD_COVERS } from './rcd-cover'
import { STANDINGS } from './standing'
import { TENURES } from './tenure'

export const SORTS = ['score', 'address', 'due', 'built', 'inspected'] as const
export type Sort = (typeof SORTS)[number]

export const COLUMNS = [
  'board',
  'cover',
  'built',
  'inspected',
  'standing',
  'defects',
  'score',
  'patch',
  'block',
  'tenure',
  'type',
  'wiring',
  'rewired',
  'bedrooms',
  'reference',
  'uprn',
  'nation',
] as const
export type Column = (typeof COLUMNS)[number]
export const FIRST_COLUMNS: readonly Column[] = [
  'board',
  'cover',
  'built',
  'inspected',
  'standing',
  'defects',
  'score',
]

/** `rewireable` asks for every home with a rewireable way: boards of that type and mixed ones. */
export const BOARD_FILTERS = ['rewireable-ways', ...BOARD_TYPES] as const

/** Whether the landlord owes the inspection of a home. */
export const DUTIES = ['owed', 'not-owed'] as const

export const HomeQuery = z.object({
  search: z.string().trim().max(120).default(''),
  patch: z.array(z.union([z.uuid(), z.literal('none')])).default([]),
  block: z.array(z.uuid()).default([]),
  board: z.array(z.enum(BOARD_FILTERS)).default([]),
  cover: z.array(z.enum(RCD_COVERS)).default([]),
  standing: z.array(z.enum(STANDINGS)).default([]),
  tenure: z.array(z.enum(TENURES)).default([]),
  nation: z.array(z.enum(NATIONS)).default([]),
  /** whether the landlord owes an inspection: see isInScope */
  duty: z.array(z.enum(DUTIES)).default([]),
  defects: z.array(z.enum(['C1', 'C2', 'C3', 'FI', 'any'])).default([]),
  builtFrom: z.coerce.number().int().min(1000).max(2100).optional(),
  builtTo: z.coerce.number().int().min(1000).max(2100).optional(),
  dueFrom: z.iso.date().optional(),
  dueTo: z.iso.date().optional(),
  /** west, south, east, north [degrees] */
  within: z.tuple([z.number(), z.number(), z.number(), z.number()]).optional(),
  sort: z.enum(SORTS).default('score'),
  order: z.enum(['asc', 'desc']).default('desc'),
  columns: z.array(z.enum(COLUMNS)).default([...FIRST_COLUMNS]),
  /** opaque: where the page before ended */
  after: z.string().max(400).optional(),
})
export type HomeQuery = z.infer<typeof HomeQuery>

type Params = Record<string, string | string[] | undefined>

const LISTS = [
  'patch',
  'block',
  'board',
  'cover',
  'standing',
  'tenure',
  'nation',
  'duty',
  'defects',
  'columns',
] as const
const SINGLES = ['search', 'builtFrom', 'builtTo', 'dueFrom', 'dueTo', 'sort', 'order', 'after'] as const

const one = (value: string | string[] | undefined) => (Array.isArray(value) ? value[0] : value) || undefined
const many = (value: string | string[] | undefined) =>
  (Array.isArray(value) ? value : value === undefined ? [] : [value])
    .flatMap((part) => part.split(','))
    .filter(Boolean)

/**
 * The query that a URL holds; what is not understood is left out rather than refused, so an old link still opens.
 * @example homeQueryOf({ board: 'rewireable-ways', sort: 'due' }).board // ['rewireable-ways']
 */
export function homeQueryOf(params: Params): HomeQuery {
  const shape = HomeQuery.shape
  const given: Record<string, unknown> = {}
  for (const key of SINGLES) {
    const result = shape[key].safeParse(one(params[key]))
    if (result.success) given[key] = result.data
  }
  for (const key of LISTS) {
    const kept = many(params[key]).filter((value) => shape[key].safeParse([value]).success)
    if (kept.length > 0) given[key] = [...new Set(kept)]
  }
  const box = (one(params.within) ?? '').split(',').map((part) => (part.trim() === '' ? NaN : Number(part)))
  if (box.length === 4 && box.every(Number.isFinite)) given.within = box
  return HomeQuery.parse(given)
}

/**
 * The URL search text of a query, without what is at its default.
 * @example homeQueryText({ ...homeQueryOf({}), search: 'herring' }) // 'search=herring'
 */
export function homeQueryText(query: HomeQuery): string {
  const plain = HomeQuery.parse({})
  const text = new URLSearchParams()
  for (const key of SINGLES) {
    const value = query[key]
    if (value !== undefined && value !== plain[key]) text.set(key, String(value))
  }
  for (const key of LISTS) {
    const value = query[key].join(',')
    if (value !== plain[key].join(',')) text.set(key, value)
  }
  if (query.within) text.set('within', query.within.join(','))
  return text.toString().replaceAll('%2C', ',')
}

/** The same, for a route handler: any parameters, as a query. */
export const HomeQueryParams = z
  .record(z.string(), z.union([z.string(), z.array(z.string())]))
  .transform((params) => homeQueryOf(params))
