import { type Tone } from '@/components/ui/state-mark'

const COLOURS: Record<Tone, string> = {
  madder: 'stroke-madder',
  amber: 'stroke-amber',
  verdigris: 'stroke-verdigris',
  blueprint: 'stroke-blueprint',
  plain: 'stroke-ink',
}
const AROUND = 100

/**
 * Time left of a duty, as what is left of a ring. The date and the clause stand beside it in words, so the ring itself
 * is silent.
 * @param left share of the time that is left [0 to 1]
 */
export function ClockRing({ left, tone, size = 36 }: { left: number; tone: Tone; size?: number }) {
  const share = Math.max(0, Math.min(1, left)) * AROUND
  return (
    <svg viewBox="0 0 36 36" width={size} height={size} className="shrink-0 -rotate-90" aria-hidden="true">
      <circle cx="18" cy="18" r="13" fill="none" strokeWidth="6" className="stroke-plate" />
      <circle
        cx="18"
        cy="18"
        r="13"
        fill="none"
        strokeWidth="6"
        pathLength={AROUND}
        strokeDasharray={`${share} ${AROUND}`}
        className={COLOURS[tone]}
      />
    </svg>
  )
}
