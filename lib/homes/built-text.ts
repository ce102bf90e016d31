/**
 * The year built as the register stores it: a year, or a span of years with a slash, `..` for an open end
 * and a leading `~` for "about". The span and its open end are those of ISO 8601-2.
 */
import { type YearBuilt } from './year-built'

const PATTERN = /^(~?)(?:(\d{4})|(\d{4}|\.\.)\/(\d{4}|\.\.))$/

/** The years that a home can have been built in: the list's filter takes the same ones. */
const EARLIEST = 1000
const LATEST = 2100

const yearOf = (text: string) => (text === '..' ? null : Number(text))
const textOf = (year: number | null) => (year === null ? '..' : String(year).padStart(4, '0'))
const isPossible = (year: number | null) => year === null || (year >= EARLIEST && year <= LATEST)

/**
 * The year built that a stored text holds, or null where it is no such text.
 * @example builtFromText('1960/1969') // { from: 1960, to: 1969, about: false }
 * @example builtFromText('~1895/1905') // { from: 1895, to: 1905, about: true }
 * @example builtFromText('../1939') // { from: null, to: 1939, about: false }
 */
export function builtFromText(text: string): YearBuilt | null {
  const match = PATTERN.exec(text)
  if (!match) return null
  const [, tilde, single, first = single, last = single] = match
  if (first === undefined || last === undefined) return null
  const from = yearOf(first)
  const to = yearOf(last)
  if (!isPossible(from) || !isPossible(to) || (from !== null && to !== null && from > to)) return null
  return { from, to, about: tilde === '~' }
}

/**
 * The stored text of a year built; {@link builtFromText} reads it back. Where nothing is known it is
 * `../..`, and a fact keeps null instead.
 * @example builtToText({ from: 1931, to: 1931, about: false }) // '1931'
 * @example builtToText({ from: 1991, to: null, about: false }) // '1991/..'
 */
export function builtToText({ from, to, about }: YearBuilt): string {
  const span = from !== null && from === to ? textOf(from) : `${textOf(from)}/${textOf(to)}`
  return about ? `~${span}` : span
}
