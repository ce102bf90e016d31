import { CELL_HEIGHT, CELL_WIDTH, DEVICE_LAYERS } from '@/components/drawings/board-paths'
import { type WayDevice } from '@/lib/electrical/consumer-unit'

/** One device of a board strip, by itself: the key to the drawing. */
export function WayDeviceDrawing({ device }: { device: WayDevice }) {
  return (
    <svg
      viewBox={`0 0 ${CELL_WIDTH} ${CELL_HEIGHT}`}
      width={20}
      height={37}
      aria-hidden="true"
      className="shrink-0"
    >
      {DEVICE_LAYERS[device].map(({ look, path, bold }, at) => (
        <path
          key={at}
          className={look}
          d={path(0)}
          strokeWidth={look.includes('stroke') ? (bold ? 2 : 1.5) : undefined}
          strokeDasharray={device === 'unknown' ? '3 3' : undefined}
          vectorEffect={look.includes('stroke') ? 'non-scaling-stroke' : undefined}
        />
      ))}
    </svg>
  )
}
