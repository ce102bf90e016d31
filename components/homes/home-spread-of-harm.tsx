import { type HazardAssessment } from '@/lib/risk/assessment'

const CLASSES = ['extreme', 'severe', 'serious', 'moderate'] as const

/** How badly people are hurt, when they are: four classes of harm, in percent. */
export function SpreadOfHarm({ hazard }: { hazard: HazardAssessment }) {
  return (
    <p className="mt-2 text-sm text-slate">
      Spread of harm:{' '}
      {CLASSES.map((name, at) => (
        <span key={name}>
          <span className="whitespace-nowrap">
            {name} <span className="text-ink">{(hazard.spread[at] ?? 0).toLocaleString('en-GB')} %</span>
          </span>
          {at < CLASSES.length - 1 && ', '}
        </span>
      ))}{' '}
      ({hazard.spreadBasis})
    </p>
  )
}
