import { BOARD_TYPE_NAMES, BOARD_TYPES } from '@/lib/homes/board-type'
import { clusterMarker, dashOf, homeMarker, MARKER_SIZE, type Part } from './marker-drawing'
import { SCORE_RING_WORDS, SCORE_RINGS } from './score-ring'

function Drawing({ parts, label }: { parts: readonly Part[]; label?: string }) {
  return (
    <svg
      viewBox={`0 0 ${MARKER_SIZE} ${MARKER_SIZE}`}
      className="size-11 shrink-0 overflow-visible"
      aria-hidden="true"
    >
      {parts.map((part, at) => (
        <path
          key={at}
          d={part.d}
          className={part.className}
          strokeWidth={part.className.includes('stroke-') ? (part.strokeWidth ?? 1) : undefined}
          strokeDasharray={dashOf(part)}
          transform={part.transform}
        />
      ))}
      {label && (
        <text
          x={MARKER_SIZE / 2}
          y="25"
          textAnchor="middle"
          className="fill-ink font-sans text-[14px] font-bold"
        >
          {label}
        </text>
      )}
    </svg>
  )
}

const SEVERAL = { rewireable: 4, mixed: 1, cartridge: 1, breakers: 5, rcbo: 2, unknown: 3 }

/** What the markers mean, in words. */
export function MapLegend() {
  return (
    <section aria-labelledby="map-legend" className="border border-line bg-surface px-4 py-3">
      <h2 id="map-legend" className="text-base">
        What the marks mean
      </h2>
      <div className="mt-2 grid gap-x-6 gap-y-1 text-sm sm:grid-cols-2 lg:grid-cols-3">
        <ul className="grid content-start sm:max-lg:grid-cols-1 lg:grid-cols-2">
          {BOARD_TYPES.map((board) => (
            <li key={board} className="flex items-center gap-2">
              <Drawing parts={homeMarker(board, 'none')} />
              {BOARD_TYPE_NAMES[board]}
            </li>
          ))}
        </ul>
        <ul>
          {SCORE_RINGS.map((ring) => (
            <li key={ring} className="flex min-h-11 items-center gap-2">
              <Drawing parts={homeMarker('breakers', ring)} />
              {SCORE_RING_WORDS[ring]}
            </li>
          ))}
        </ul>
        <div className="flex items-start gap-2">
          <Drawing parts={clusterMarker(16, SEVERAL, 'single')} label="16" />
          <p className="py-2">
            Several homes. The bar under their number: solid for rewireable fuses, dashed for not known, plain
            for the others. Its rings are those of the highest score among them.
          </p>
        </div>
      </div>
    </section>
  )
}
