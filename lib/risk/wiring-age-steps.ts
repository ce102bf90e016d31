/** A point of the line that wiring ages along: steps at an age in years. */
export type AgePoint = { readonly years: number; readonly steps: number }

/**
 * Steps for wiring of an age, along straight lines between the points; level before the first and after the last.
 * @param points youngest first
 * @example wiringAgeSteps(50, [{ years: 40, steps: 1 }, { years: 60, steps: 2 }]) // 1.5
 */
export function wiringAgeSteps(years: number, points: readonly AgePoint[]): number {
  let before: AgePoint | null = null
  for (const point of points) {
    if (years <= point.years) {
      if (before === null) return point.steps
      const part = (years - before.years) / (point.years - before.years)
      return before.steps + part * (point.steps - before.steps)
    }
    before = point
  }
  return before?.steps ?? 0
}
