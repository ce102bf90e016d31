import { isDuplicate } from '@/db/duplicate'
import { oneLine } from '@/lib/forms/one-line'
import { Invalid } from '@/lib/errors/expected'

export const patchName = oneLine('Enter a name for the patch.', 120)

/** Does the work, and says so at the field where another patch of the organisation has the name. */
export async function withFreeName<Result>(work: Promise<Result>): Promise<Result> {
  try {
    return await work
  } catch (thrown) {
    if (isDuplicate(thrown))
      throw new Invalid([{ field: 'name', problem: 'There is a patch of that name already.' }])
    throw thrown
  }
}
