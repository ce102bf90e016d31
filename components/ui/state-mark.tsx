import { classNames } from './class-names'

/** What a state means: danger, attention, good, not known, or nothing in particular. */
export type Tone = 'madder' | 'amber' | 'verdigris' | 'blueprint' | 'plain'

/** A tone's shape: square, triangle, circle, dashed circle, bar. It says without colour what the colour says. */
export function StateMark({ tone, className }: { tone: Tone; className?: string }) {
  const shape = {
    madder: <rect x="1" y="1" width="10" height="10" fill="currentColor" />,
    amber: <path d="M6 .8 11.7 11.200H.3Z" fill="currentColor" />,
    verdigris: <circle cx="6" cy="6" r="5.4" fill="currentColor" />,
    blueprint: (
      <circle
        cx="6"
        cy="6"
        r="4.8"
        fill="none"
        stroke="currentColor"
        strokeWidth="1.4"
        strokeDasharray="2.2 1.57"
      />
    ),
    plain: <rect x="1" y="4.5" width="10" height="3" fill="currentColor" />,
  }[tone]
  return (
    <svg viewBox="0 0 12 12" className={classNames('size-3 shrink-0', className)} aria-hidden="true">
      {shape}
    </svg>
  )
}
