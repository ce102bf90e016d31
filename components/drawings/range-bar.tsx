import { type Nation } from '@/lib/homes/nation'
import { type BandEdge, bandEdges, bandOf, CATEGORY_1_FROM, usesHazardBands } from '@/lib/risk/bands'

type Props = {
  score: number
  /** 5 and 95 % points over what the unknown facts could be */
  low: number
  high: number
  nation: Nation
  size?: 'list' | 'card'
  /** the figure stands beside it already */
  decorative?: boolean
}

const MOST = 100_000
const DECADES = Math.log10(MOST)

/** Where a score stands on the log axis from 1 to 100,000 [0 to 1]; beyond an end, at that end. */
export const placeOnAxis = (score: number): number => Math.log10(Math.min(MOST, Math.max(1, score))) / DECADES

const whole = (score: number) => Math.round(score).toLocaleString('en-GB')

function inWords({ score, low, high, nation }: Props): string {
  const band = bandOf(score, nation).name
  const compared = usesHazardBands(nation) ? '' : ', to compare by'
  const range = whole(low) === whole(high) ? '' : `, range ${whole(low)} to ${whole(high)}`
  return `Score ${whole(score)}, band ${band}${compared}${range}`
}

const SHAPES = {
  list: { width: 124, height: 20, axis: 10, mark: 5, cap: 3, line: 2.5 },
  card: { width: 340, height: 50, axis: 15, mark: 8.5, cap: 7, line: 3.5 },
} as const
const MARGIN = 9

/** The names of the bands, each in the middle of its own stretch of the axis. */
function Bands({ edges, at }: { edges: readonly BandEdge[]; at: (score: number) => number }) {
  return edges.map(({ name, from }, index) => {
    const left = at(from)
    const right = at(edges[index + 1]?.from ?? MOST)
    return (
      <g key={name}>
        {from > 0 && <path d={`M${left} 7v16`} className="stroke-edge" strokeWidth="1" />}
        <text x={(left + right) / 2} y="42" textAnchor="middle" className="fill-slate text-[13px]">
          {name}
        </text>
      </g>
    )
  })
}

/**
 * A score as a mark on a log axis, with a whisker for what the unknowns leave open. The shaded end begins where the
 * method's category 1 does; the bands under it are those of the home's nation.
 */
export function RangeBar(props: Props) {
  const { score, low, high, nation, size = 'list', decorative } = props
  const { width, height, axis, mark, cap, line } = SHAPES[size]
  const at = (value: number) => Math.round((MARGIN + placeOnAxis(value) * (width - 2 * MARGIN)) * 10) / 10
  const [x, from, to, danger] = [at(score), at(low), at(high), at(CATEGORY_1_FROM)]
  const said = decorative ? { 'aria-hidden': true as const } : { role: 'img', 'aria-label': inWords(props) }
  return (
    <svg
      {...said}
      viewBox={`0 0 ${width} ${height}`}
      width={width}
      height={height}
      className={size === 'list' ? 'block' : 'block h-auto max-w-full'}
    >
      <rect
        x={danger}
        y={axis - cap - 2}
        width={width - danger}
        height={2 * cap + 4}
        className="fill-madder-wash"
      />
      <path d={`M${MARGIN} ${axis}H${width - MARGIN}`} className="stroke-edge" strokeWidth="1" />
      {size === 'card' && <Bands edges={bandEdges(nation)} at={at} />}
      <path d={`M${danger} ${axis - cap - 2}v${2 * cap + 4}`} className="stroke-madder" strokeWidth="1.5" />
      {to - from > 1 && (
        <path
          d={`M${from} ${axis}H${to}M${from} ${axis - cap}v${2 * cap}M${to} ${axis - cap}v${2 * cap}`}
          className="fill-none stroke-copper"
          strokeWidth={line}
        />
      )}
      <path
        d={`M${x} ${axis - mark}l${mark} ${mark}l${-mark} ${mark}l${-mark} ${-mark}z`}
        className="fill-copper stroke-surface"
        strokeWidth={size === 'card' ? 2 : 1.5}
        paintOrder="stroke"
      />
    </svg>
  )
}
