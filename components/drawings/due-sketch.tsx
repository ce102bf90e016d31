/** Invented: homes whose report ends in each of forty weeks, of which the first eight are past. */
const WEEKS = [
  4, 9, 3, 2, 12, 8, 14, 6, 9, 12, 17, 23, 26, 18, 12, 28, 33, 24, 26, 36, 20, 27, 23, 19, 18, 17, 22, 15, 11,
  14, 10, 9, 13, 14, 16, 23, 21, 20, 30, 26,
]
const PAST = 8

/** The due line in small, for the public page: it shows the kind, not the homes of anybody. */
export function DueSketch() {
  return (
    <svg
      viewBox="0 0 480 110"
      className="block h-auto w-full"
      role="img"
      aria-label="A row of weeks as bars: the first are past and outlined in red; a line marks today; the rest are to come."
    >
      {WEEKS.map((homes, at) => {
        const height = homes * 2.4
        return (
          <path
            key={at}
            d={`M${at * 12 + 1.5} 96v${2 - height}q0-2 2-2h5q2 0 2 2v${height - 2}`}
            className={at < PAST ? 'fill-madder-wash stroke-madder' : 'fill-none stroke-copper'}
            strokeWidth="1.4"
          />
        )
      })}
      <path d="M0 96.5H480" className="stroke-ink" strokeWidth="1.5" />
      <path d={`M${PAST * 12} 0V104`} className="stroke-ink" strokeWidth="2" />
      <text x={PAST * 12 + 7} y="10" className="fill-ink text-[13px] font-semibold">
        today
      </text>
    </svg>
  )
}
