/** The least time that an answer takes whose content must not tell what was found [ms]. Judgement. */
const LEAST = 400

/** Does the work and answers no sooner than a fixed time, whatever was found. */
export async function unhurried<Result>(work: Promise<Result>, least = LEAST): Promise<Result> {
  const [result] = await Promise.allSettled([work, new Promise((resolve) => setTimeout(resolve, least))])
  if (result.status === 'rejected') throw result.reason
  return result.value
}
