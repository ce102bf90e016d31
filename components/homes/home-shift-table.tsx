import { classNames } from '@/components/ui/class-names'
import { StateMark } from '@/components/ui/state-mark'
import { type Basis, type HazardAssessment } from '@/lib/risk/assessment'
import { likelihoodInWords } from '@/lib/risk/explanation-words'
import { layOutShifts, type PlacedShift, type ShiftTrack } from './home-shift-track'
import { stepsInWords } from './home-words'

const WIDTH = 132
const HEIGHT = 12
/** What is shown as no step is drawn as none. */
const SMALLEST_DRAWN = 0.05

/** How far one shift moves the likelihood, beginning where the one above it ended. */
function TrackPiece({ piece, track }: { piece: PlacedShift; track: ShiftTrack }) {
  const at = (steps: number) => 1 + ((steps - track.least) / (track.most - track.least)) * (WIDTH - 2)
  const [from, to] = [at(piece.from), at(piece.to)]
  const left = Math.min(from, to)
  const width = Math.max(2, Math.abs(to - from))
  const isOutlined = piece.shift.unknown && width > 4
  const { unknown, steps } = piece.shift
  const look = isOutlined
    ? 'fill-none stroke-blueprint'
    : unknown
      ? 'fill-blueprint'
      : steps < 0
        ? 'fill-verdigris'
        : 'fill-copper'
  return (
    <svg
      viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
      width={WIDTH}
      height={HEIGHT}
      aria-hidden="true"
      className="block"
    >
      <path d={`M${at(0)} 0v${HEIGHT}`} className="stroke-edge" strokeWidth="1" />
      {Math.abs(steps) >= SMALLEST_DRAWN && (
        <rect
          data-solid
          x={isOutlined ? left + 0.75 : left}
          y="1.5"
          width={isOutlined ? width - 1.5 : width}
          height={HEIGHT - 3}
          className={look}
          strokeWidth={isOutlined ? 1.5 : undefined}
          strokeDasharray={isOutlined ? '3 2' : undefined}
        />
      )}
    </svg>
  )
}

const cell = 'py-2 align-baseline print:py-0.5'
const basisCell = 'hidden py-2 pl-3 text-right align-baseline text-sm text-slate sm:table-cell print:py-0.5'

/** Where there is no room for a column of its own. */
const BasisBelow = ({ basis }: { basis: Basis }) => (
  <span className="block text-sm text-slate sm:hidden">{basis}</span>
)

function ShiftRow({ piece, track }: { piece: PlacedShift; track: ShiftTrack }) {
  const { reason, steps, basis, unknown } = piece.shift
  return (
    <tr className="border-t border-line">
      <th scope="row" className={classNames(cell, 'pr-3 text-left font-normal', unknown && 'text-blueprint')}>
        {unknown ? (
          <>
            <span className="inline-flex items-baseline gap-2">
              <StateMark tone="blueprint" className="translate-y-px" />
              {reason}
            </span>
            <span className="block text-sm">the mean of what it could be</span>
          </>
        ) : (
          reason
        )}
        <BasisBelow basis={basis} />
      </th>
      <td className="hidden py-2 pt-3.5 pr-3 align-top sm:table-cell print:hidden" aria-hidden="true">
        <TrackPiece piece={piece} track={track} />
      </td>
      <td className={classNames(cell, 'text-right figures whitespace-nowrap', unknown && 'text-blueprint')}>
        {stepsInWords(steps)}
      </td>
      <td className={basisCell}>{basis}</td>
    </tr>
  )
}

/**
 * How a hazard's likelihood comes about: the national average, each shift from it, and where that ends. The pieces
 * beside the shifts lie end to end.
 */
export function HomeShiftTable({ hazard, caption }: { hazard: HazardAssessment; caption: string }) {
  const { base, shifts, oneIn } = hazard
  const track = layOutShifts(shifts)
  return (
    <table className="w-full border-collapse border-y border-line text-left">
      <caption className="sr-only">{caption}</caption>
      <thead>
        <tr className="text-sm text-slate">
          <th scope="col" className="py-1.5 pr-3 font-semibold">
            What bears on it
          </th>
          <td className="hidden sm:table-cell print:hidden" aria-hidden="true" />
          <th scope="col" className="py-1.5 text-right font-semibold">
            Steps
          </th>
          <th scope="col" className="hidden py-1.5 pl-3 text-right font-semibold sm:table-cell">
            Basis
          </th>
        </tr>
      </thead>
      <tbody>
        <tr className="border-t border-line">
          <th scope="row" className={classNames(cell, 'pr-3 text-left font-normal')}>
            The average to start from
            <span className="block text-sm text-slate">{base.words}</span>
            <BasisBelow basis={base.basis} />
          </th>
          <td className="py-2 text-right align-baseline figures whitespace-nowrap sm:hidden print:table-cell print:py-0.5">
            {likelihoodInWords(base.oneIn)}
          </td>
          <td
            colSpan={2}
            className="hidden py-2 text-right align-baseline figures whitespace-nowrap sm:table-cell print:hidden"
          >
            {likelihoodInWords(base.oneIn)}
          </td>
          <td className={basisCell}>{base.basis}</td>
        </tr>
        {track.placed.map((piece) => (
          <ShiftRow key={`${piece.shift.fact} ${piece.shift.reason}`} piece={piece} track={track} />
        ))}
        <tr className="border-t-2 border-edge font-semibold">
          <th scope="row" className={classNames(cell, 'pr-3 text-left font-semibold')}>
            Likelihood in the next twelve months
          </th>
          <td className="py-2 text-right align-baseline figures whitespace-nowrap sm:hidden print:table-cell print:py-0.5">
            {likelihoodInWords(oneIn)}
          </td>
          <td
            colSpan={2}
            className="hidden py-2 text-right align-baseline figures whitespace-nowrap sm:table-cell print:hidden"
          >
            {likelihoodInWords(oneIn)}
          </td>
          <td className="hidden sm:table-cell" />
        </tr>
      </tbody>
    </table>
  )
}
