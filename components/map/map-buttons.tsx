import { Button } from '@/components/ui/button'

export type MapMove = 'in' | 'out' | 'left' | 'right' | 'up' | 'down' | 'all'

const MOVES: readonly (readonly [move: MapMove, name: string, sign: string])[] = [
  ['in', 'Zoom in', '+'],
  ['out', 'Zoom out', '−'],
  ['left', 'Move left', '←'],
  ['up', 'Move up', '↑'],
  ['down', 'Move down', '↓'],
  ['right', 'Move right', '→'],
]

/** Moves the map without dragging. */
export function MapButtons({ onMove }: { onMove: (move: MapMove) => void }) {
  return (
    <div
      role="group"
      aria-label="Move the map"
      className="no-print absolute top-3 left-3 z-[1000] flex max-w-[calc(100%-1.5rem)] flex-wrap gap-1.5"
    >
      {MOVES.map(([move, name, sign]) => (
        <Button
          key={move}
          kind="secondary"
          size="compact"
          className="min-w-8"
          title={name}
          aria-label={name}
          onClick={() => onMove(move)}
        >
          <span aria-hidden="true">{sign}</span>
        </Button>
      ))}
      <Button kind="secondary" size="compact" onClick={() => onMove('all')}>
        All homes
      </Button>
    </div>
  )
}
