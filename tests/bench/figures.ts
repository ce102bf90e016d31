/** One line of the benchmark's table. */
export type Figure = {
  readonly what: string
  readonly value: number
  readonly unit: string
  /** the bare work of the same run, in the same unit */
  readonly bare?: number
  /** the most that the value, or its ratio to the bare work, may be */
  readonly most?: number
  readonly mostIs?: 'ratio' | 'value'
}

const round = (value: number) =>
  value >= 100 ? Math.round(value).toLocaleString('en-GB') : value.toPrecision(3)

/** Whether a figure keeps what it must; null where nothing is asked of it. */
export function keeps({ value, bare, most, mostIs = 'ratio' }: Figure): boolean | null {
  if (most === undefined) return null
  return mostIs === 'value' ? value <= most : bare !== undefined && value / bare < most
}

/** The table, in columns. */
export function printFigures(figures: readonly Figure[]): void {
  const rows = figures.map((figure) => {
    const { what, value, unit, bare, most, mostIs = 'ratio' } = figure
    const kept = keeps(figure)
    return [
      what,
      `${round(value)} ${unit}`,
      bare === undefined ? '' : `${round(bare)} ${unit}`,
      bare === undefined ? '' : `${(value / bare).toFixed(2)}x`,
      most === undefined ? '' : mostIs === 'value' ? `at most ${round(most)}` : `under ${most}x`,
      kept === null ? '' : kept ? 'kept' : 'MISSED',
    ]
  })
  const all = [['what', 'measured', 'bare', 'ratio', 'target', ''], ...rows]
  const widths = all[0]?.map((_, column) => Math.max(...all.map((row) => (row[column] ?? '').length))) ?? []
  for (const row of all)
    process.stdout.write(
      `${row
        .map((cell, column) => cell.padEnd(widths[column] ?? 0))
        .join('  ')
        .trimEnd()}\n`,
    )
}
