type Props = {
  /** homes with rewireable fuses */
  rewireable: number
  /** homes of which it is not known */
  unknown: number
  total: number
}

/** How much of a patch has rewireable fuses (solid) and of how much it is not known (dashed). */
export function ShareBar({ rewireable, unknown, total }: Props) {
  const share = (homes: number) => `${total > 0 ? Math.min(100, (homes / total) * 100) : 0}%`
  const count = (homes: number) => homes.toLocaleString('en-GB')
  return (
    <div
      role="img"
      aria-label={`${count(rewireable)} with rewireable fuses and ${count(unknown)} not known, of ${count(total)}`}
      className="flex h-3.5 min-w-24 overflow-hidden rounded-plate bg-plate print:border print:border-edge"
    >
      {rewireable > 0 && (
        <div
          data-solid
          className="min-w-0.5 bg-copper print:[print-color-adjust:exact]"
          style={{ width: share(rewireable) }}
        />
      )}
      {unknown > 0 && (
        <div
          className="min-w-1 border-[1.5px] border-dashed border-blueprint bg-surface"
          style={{ width: share(unknown) }}
        />
      )}
    </div>
  )
}
