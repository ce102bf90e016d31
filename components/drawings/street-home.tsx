import { type ReactNode } from 'react'
import { classNames } from '@/components/ui/class-names'

/** The five homes of the street, by the year they were built. */
export type StreetHomeYear = 1911 | 1937 | 1964 | 1983 | 2019

const wall = 'fill-surface stroke-ink'
const roof = 'fill-sunken stroke-ink'
const glass = 'fill-paper stroke-ink'
const lit = 'fill-amber-wash stroke-ink dark:fill-amber'
const door = 'fill-copper-wash stroke-ink'

/** Each is drawn on a ground line at 180, 240 wide, so that side by side they make one street. */
const DRAWINGS: Record<StreetHomeYear, ReactNode> = {
  1911: (
    <>
      <path className={roof} d="M36 78V34h20v26M44 34V22h5v12" />
      <path className={roof} d="M26 82 60 52H180L214 82Z" />
      <path className={wall} d="M34 82H206V180H34Z" />
      <path className={lit} d="M56 98H80V122H56ZM160 98H184V122H160Z" />
      <path className={wall} d="M46 138 54 130H98L106 138V180H46Z" />
      <path className={glass} d="M54 144H66V170H54ZM70 144H82V170H70ZM86 144H98V170H86Z" />
      <path className={door} d="M148 136H176V180H148ZM148 148H176" />
      <path className={glass} d="M108 98H132V122H108Z" />
    </>
  ),
  1937: (
    <>
      <path className={roof} d="M150 64V40h18v36" />
      <path className={roof} d="M22 92 74 44H166L218 92Z" />
      <path className={wall} d="M36 92H204V180H36Z" />
      <path className={wall} d="M52 92V180H112V92a30 20 0 0 0-60 0Z" />
      <path
        className={glass}
        d="M60 102H104V120H60ZM75 102V120M90 102V120M60 142H104V164H60ZM75 142V164M90 142V164"
      />
      <path className={door} d="M142 180V148a16 16 0 0 1 32 0V180Z" />
      <path className={glass} d="M144 102H172V120H144Z" />
    </>
  ),
  1964: (
    <>
      <path className={wall} d="M40 26H200V180H40Z" />
      <path className={roof} d="M34 18H206V26H34ZM92 8H120V18H92Z" />
      <path
        className={glass}
        d="M54 38H96V56H54ZM144 38H186V56H144ZM54 74H96V92H54ZM144 110H186V128H144ZM54 110H96V128H54ZM144 146H186V164H144ZM54 146H96V164H54Z"
      />
      <path className={lit} d="M144 74H186V92H144Z" />
      <path
        className="fill-none stroke-ink"
        d="M48 62H102M138 62H192M48 98H102M138 98H192M48 134H102M138 134H192M75 38V56M165 38V56M75 74V92M165 74V92M75 110V128M165 110V128"
      />
      <path className={door} d="M108 146H132V180H108ZM120 146V180" />
      <path className={glass} d="M112 38H128V128H112ZM112 68H128M112 98H128" />
    </>
  ),
  1983: (
    <>
      <path className={wall} d="M30 108H210V180H30Z" />
      <path className={roof} d="M22 108 82 62H146L156 70V56H172V82L210 108Z" />
      <path className={lit} d="M94 122H142V160H94ZM118 122V160" />
      <path className={door} d="M156 128H180V180H156Z" />
      <path className="fill-sunken stroke-ink" d="M40 130H80V180H40ZM40 142H80M40 154H80M40 166H80" />
      <path className={wall} d="M92 106V88L114 72L136 88V106Z" />
      <path className={glass} d="M104 88H124V102H104Z" />
    </>
  ),
  2019: (
    <>
      <path className={wall} d="M36 180V76L112 30L204 76V180Z" />
      <path className={roof} d="M26 84 112 30 214 82 210 92 112 42 32 94Z" />
      <path
        className="fill-verdigris-wash stroke-verdigris"
        d="M132 39 178 62.5 172 72 126 49ZM147 46.7 141 56.5M163 54.8 157 64.5"
      />
      <path className={glass} d="M58 100H82V168H58ZM98 100H122V126H98ZM98 142H122V168H98Z" />
      <path className={door} d="M140 130H166V180H140Z" />
      <path className={lit} d="M140 92H186V116H140ZM163 92V116" />
      <path className="fill-verdigris stroke-ink" d="M180 148H190V172H180Z" />
    </>
  ),
}

type Props = {
  year: StreetHomeYear
  /** the first of a row: its street and its cable run on under the others and past both ends of the page */
  runsOn?: boolean
  className?: string
}

/** A home of the street, on its ground line, with the supply that comes in underneath. */
export function StreetHome({ year, runsOn, className }: Props) {
  return (
    <svg
      viewBox="0 0 240 216"
      className={classNames('overflow-visible', className)}
      strokeWidth="1.6"
      strokeLinejoin="round"
      aria-hidden="true"
    >
      <path d="M0 180H240" className="stroke-ink" strokeWidth="2.4" />
      <path d="M0 202H240" className="stroke-copper" strokeWidth="3" />
      {runsOn && (
        <g className="max-lg:hidden">
          <path d="M-6000 180H6000" className="stroke-ink" strokeWidth="2.4" />
          <path d="M-6000 202H6000" className="stroke-copper" strokeWidth="3" />
        </g>
      )}
      {DRAWINGS[year]}
      <path d="M20 202V216" className="fill-none stroke-copper" strokeWidth="3" />
      <circle cx="20" cy="202" r="5" className="fill-verdigris" />
    </svg>
  )
}
