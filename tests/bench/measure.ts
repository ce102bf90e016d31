/** Timing: medians and 95th percentiles of repeated work [ms]. */

export type Timing = { readonly median: number; readonly p95: number }

const at = (sorted: readonly number[], share: number) =>
  sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * share))] ?? NaN

/** Runs the work a few times to warm it, then `times` times, one after another. */
export async function timing(times: number, work: (run: number) => Promise<unknown>): Promise<Timing> {
  for (let run = 0; run < 3; run += 1) await work(run)
  const taken: number[] = []
  for (let run = 0; run < times; run += 1) {
    const began = performance.now()
    await work(run)
    taken.push(performance.now() - began)
  }
  taken.sort((a, b) => a - b)
  return { median: at(taken, 0.5), p95: at(taken, 0.95) }
}

/** How long some work takes, once [ms], and what it gives. */
export async function once<T>(work: () => Promise<T>): Promise<{ milliseconds: number; result: T }> {
  const began = performance.now()
  const result = await work()
  return { milliseconds: performance.now() - began, result }
}
