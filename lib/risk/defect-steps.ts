/**
 * Steps for a number of open defects of one code: the first counts fully, each further one less, nearing a most.
 * @param first steps of the first [0 upwards]
 * @param most steps that any number comes near to [first upwards]
 * @example defectSteps(0, 3, 4.5) // 0
 * @example defectSteps(1, 3, 4.5) // 3
 * @example defectSteps(2, 3, 4.5) // 4
 */
export function defectSteps(count: number, first: number, most: number): number {
  if (count <= 0 || most <= 0) return 0
  return most * (1 - (1 - Math.min(1, first / most)) ** count)
}
