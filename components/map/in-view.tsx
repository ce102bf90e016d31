import Link from 'next/link'
import { Button } from '@/components/ui/button'
import { Disclosure } from '@/components/ui/disclosure'
import { clusterInWords, homeInWords } from './feature-words'
import { type Box, type HomesOnMap } from './homes-on-map'

/** A longer list helps nobody; zooming in shortens it. */
const MOST_LISTED = 200

type Props = { homes: HomesOnMap; onCluster: (box: Box) => void }

/** Everything that the map shows, in words: clusters to go to, homes to open. The way that needs no pointer. */
export function InView({ homes, onCluster }: Props) {
  const clusters = [...homes.clusters].sort((a, b) => b.highestScore - a.highestScore).slice(0, MOST_LISTED)
  const points = [...homes.points].sort((a, b) => b.score - a.score).slice(0, MOST_LISTED - clusters.length)
  const all = homes.clusters.length + homes.points.length
  return (
    <Disclosure
      summary={`What the map shows, in words (${all.toLocaleString('en-GB')})`}
      className="no-print"
    >
      <ul
        className="max-h-80 overflow-y-auto border border-line bg-surface"
        tabIndex={0}
        aria-label="On the map"
      >
        {clusters.map((cluster) => (
          <li
            key={`${cluster.longitude} ${cluster.latitude}`}
            className="border-b border-line last:border-b-0"
          >
            <Button
              kind="quiet"
              size="compact"
              className="w-full justify-start text-left"
              onClick={() => onCluster(cluster.box)}
            >
              Go to {clusterInWords(cluster)}
            </Button>
          </li>
        ))}
        {points.map((home) => (
          <li key={home.id} className="border-b border-line px-2.5 py-1 text-sm last:border-b-0">
            <Link href={`/homes/${home.id}`} prefetch={false} className="link-block link">
              {homeInWords(home)}
            </Link>
          </li>
        ))}
      </ul>
      {all > MOST_LISTED && (
        <p className="mt-2 text-sm text-slate">
          The {MOST_LISTED} with the highest scores; zoom in for the others.
        </p>
      )}
    </Disclosure>
  )
}
