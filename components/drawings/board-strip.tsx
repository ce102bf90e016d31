import { ScrollRegion } from '@/components/ui/scroll-region'
import { boardInWords } from '@/lib/electrical/board-in-words'
import { type WayDevice, waysOf } from '@/lib/electrical/consumer-unit'
import { type BoardType } from '@/lib/homes/board-type'
import { type RcdCover } from '@/lib/homes/rcd-cover'
import { type BoardLayout, FIRST_WAY, layOutBoard } from './board-layout'
import {
  bracket,
  CELL_GAP,
  CELL_HEIGHT,
  CELL_WIDTH,
  DEVICE_LAYERS,
  type Layer,
  MAIN_SWITCH_LAYERS,
  openBracket,
  openEnd,
  RCD_LAYERS,
} from './board-paths'

/** scale: pixels to a cell unit. line: stroke [px]. dash: of what is not known [px]. widest [px]. */
const SIZES = {
  list: { scale: 1 / 3, line: 1, bold: 1.25, dash: '2 2', widest: 190 },
  card: { scale: 2 / 3, line: 1.5, bold: 2, dash: '3 3', widest: 720 },
  full: { scale: 1.1, line: 2, bold: 2.75, dash: '5 4', widest: 1100 },
} as const
export type BoardSize = keyof typeof SIZES

type Props = {
  /** board strip code, see lib/electrical/consumer-unit; null where only the type is known */
  ways: string | null
  boardType: BoardType
  rcdCover: RcdCover
  size?: BoardSize
  /** the words stand beside it already: the drawing alone says nothing more */
  decorative?: boolean
}
/** A board wider than this [cell units] shrinks on a phone to this share of its size, and then scrolls. */
const WIDE = 560
const LEAST_SHARE = 0.6

type Look = (typeof SIZES)[BoardSize]

/** One path for each layer, drawn at every given place. */
function Layers({
  layers,
  at,
  look,
  dashed,
}: {
  layers: readonly Layer[]
  at: readonly number[]
  look: Look
  dashed?: boolean
}) {
  return layers.map(({ look: colours, path, bold }, index) => (
    <path
      key={index}
      className={colours}
      d={at.map(path).join('')}
      strokeWidth={colours.includes('stroke') ? (bold ? look.bold : look.line) : undefined}
      strokeDasharray={dashed ? look.dash : undefined}
      vectorEffect={colours.includes('stroke') ? 'non-scaling-stroke' : undefined}
    />
  ))
}

function Line({
  path,
  look,
  colour,
  dashed,
}: {
  path: string
  look: Look
  colour: string
  dashed?: boolean
}) {
  return (
    <path
      className={`fill-none ${colour}`}
      d={path}
      strokeWidth={look.bold}
      strokeDasharray={dashed ? look.dash : undefined}
      vectorEffect="non-scaling-stroke"
    />
  )
}

/** Way by way, as it is on record. */
function KnownBoard({ board, look, size }: { board: BoardLayout; look: Look; size: BoardSize }) {
  const devices = [...new Set(board.ways.map(({ device }) => device))]
  return (
    <>
      {devices.map((device) => {
        const at = board.ways.filter((way) => way.device === device).map(({ x }) => x)
        return (
          <Layers
            key={device}
            layers={DEVICE_LAYERS[device]}
            at={at}
            look={look}
            dashed={device === 'unknown'}
          />
        )
      })}
      {board.rcds.length > 0 && (
        <>
          <Layers layers={RCD_LAYERS} at={board.rcds} look={look} />
          <Line
            path={board.brackets.map(([from, to]) => bracket(from, to)).join('')}
            look={look}
            colour="stroke-verdigris"
          />
        </>
      )}
      {size === 'full' && (
        <g className="font-sans text-[11px]" textAnchor="middle">
          {board.ways.map(({ x, number, device }) => (
            <text key={number} x={x + CELL_WIDTH / 2} y={CELL_HEIGHT + 21} className="fill-slate">
              {device === 'unknown' ? '?' : number}
            </text>
          ))}
          {board.rcds.map((x) => (
            <text key={x} x={x + 24} y={59} className="fill-verdigris text-[9px] font-bold">
              RCD
            </text>
          ))}
        </g>
      )}
    </>
  )
}

/** What stands for a type: three ways, of which nobody has counted how many more there are. */
const TYPE_DEVICES: Record<BoardType, readonly [WayDevice, WayDevice, WayDevice]> = {
  rewireable: ['rewireable', 'rewireable', 'rewireable'],
  cartridge: ['cartridge', 'cartridge', 'cartridge'],
  breakers: ['breaker', 'breaker', 'breaker'],
  rcbo: ['rcbo', 'rcbo', 'rcbo'],
  mixed: ['rewireable', 'breaker', 'rewireable'],
  unknown: ['unknown', 'unknown', 'unknown'],
}
const FADES = [1, 0.62, 0.3]
const TYPE_ONLY_END = FIRST_WAY + 3 * (CELL_WIDTH + CELL_GAP)
const TYPE_ONLY_WIDTH = TYPE_ONLY_END + 42

/** Only the type is known: the ways fade into an open end, so that no count is made up. */
function TypeOnlyBoard({
  boardType,
  rcdCover,
  look,
}: {
  boardType: BoardType
  rcdCover: RcdCover
  look: Look
}) {
  const behindRcd =
    boardType !== 'rcbo' && (rcdCover === 'all' || rcdCover === 'part' || rcdCover === 'sockets')
  return (
    <>
      {TYPE_DEVICES[boardType].map((device, at) => (
        <g key={at} opacity={FADES[at]}>
          <Layers
            layers={DEVICE_LAYERS[device]}
            at={[FIRST_WAY + at * (CELL_WIDTH + CELL_GAP)]}
            look={look}
            dashed={device === 'unknown'}
          />
        </g>
      ))}
      <Line path={openEnd(TYPE_ONLY_END)} look={look} colour="stroke-blueprint" dashed />
      {behindRcd && (
        <Line
          path={openBracket(
            rcdCover === 'all' ? FIRST_WAY + 1 : FIRST_WAY + CELL_WIDTH + CELL_GAP,
            TYPE_ONLY_WIDTH - 4,
          )}
          look={look}
          colour="stroke-verdigris"
          dashed={rcdCover !== 'all'}
        />
      )}
    </>
  )
}

/**
 * A home's consumer unit as a row of ways, main switch first, with the same in words for those who listen.
 * A rewireable way is an open carrier with a bare wire, a cartridge a capsule, a breaker a rocker, an RCBO a rocker with
 * a test button, a blank a plain plate, a way not known dashed and hollow; an RCD stands before the ways it protects,
 * with a bracket under them.
 */
export function BoardStrip({ ways, boardType, rcdCover, size = 'list', decorative }: Props) {
  const known = ways === null ? null : waysOf(ways)
  const board = known && layOutBoard(known)
  const look = SIZES[size]
  const width = board?.width ?? TYPE_ONLY_WIDTH
  const height = CELL_HEIGHT + (size === 'full' ? 26 : 12)
  const scale = Math.min(look.scale, look.widest / width)
  const isWide = size === 'full' && width > WIDE
  const said = decorative
    ? { 'aria-hidden': true as const }
    : { role: 'img', 'aria-label': boardInWords({ ways, boardType, rcdCover }) }
  const drawing = (
    <svg
      {...said}
      viewBox={`0 0 ${width} ${height}`}
      preserveAspectRatio="xMinYMid"
      width={Math.round(width * scale)}
      height={Math.round(height * scale)}
      className={size === 'list' ? 'block' : 'block h-auto max-w-full'}
      style={isWide ? { minWidth: Math.round(width * scale * LEAST_SHARE) } : undefined}
    >
      <Layers layers={MAIN_SWITCH_LAYERS} at={[0]} look={look} />
      {board ? (
        <KnownBoard board={board} look={look} size={size} />
      ) : (
        <TypeOnlyBoard {...{ boardType, rcdCover, look }} />
      )}
    </svg>
  )
  return isWide ? <ScrollRegion label="Consumer unit, way by way">{drawing}</ScrollRegion> : drawing
}
