type Props = {
  /** what is under way: "Reading the file" */
  label: string
  done: number
  /** null where it is not known how much there is */
  total: number | null
  /** what is counted: "rows" */
  unit?: string
}

/** Long work as a bar and in words. */
export function Progress({ label, done, total, unit = '' }: Props) {
  const share = total ? Math.min(100, Math.floor((done / total) * 100)) : null
  const count = (n: number) => n.toLocaleString('en-GB')
  const words =
    share === null
      ? `${count(done)} ${unit} so far`
      : `${count(done)} of ${count(total ?? 0)} ${unit}, ${share} %`
  return (
    <div>
      <div className="flex flex-wrap justify-between gap-x-4">
        <span className="font-semibold">{label}</span>
        <span className="text-slate tabular-nums">{words.replaceAll('  ', ' ').replace(' ,', ',')}</span>
      </div>
      <div
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={100}
        aria-valuenow={share ?? undefined}
        aria-valuetext={words}
        className="mt-2 h-3 overflow-hidden rounded-plate border border-edge bg-surface"
      >
        <div
          className={
            share === null ? 'h-full w-1/3 animate-pulse bg-copper' : 'h-full bg-copper transition-[width]'
          }
          style={share === null ? undefined : { width: `${share}%` }}
        />
      </div>
    </div>
  )
}
