import { listKnown, findByKeys } from '@/db/repositories/home-intake'
import { type Scope } from '@/db/connection'
import { type Nation } from '@/lib/homes/nation'
import { type HomeDraft } from '@/lib/imports/home-draft'
import { matchDrafts } from '@/lib/imports/match-drafts'
import { mergeDraft, type MergePlan } from '@/lib/imports/merge-draft'

export type PlannedDrafts = {
  readonly plans: readonly MergePlan[]
  readonly clashes: readonly { readonly draft: HomeDraft; readonly why: string }[]
}

const present = (values: readonly (string | null)[]) =>
  values.filter((value): value is string => value !== null)

/** Finds the homes that some drafts are about, and decides what each draft changes. Reads only. */
export async function planDrafts(
  scope: Scope,
  drafts: readonly HomeDraft[],
  nation: Nation,
): Promise<PlannedDrafts> {
  const keys = await findByKeys(scope, {
    uprns: present(drafts.map((draft) => draft.uprn)),
    references: present(drafts.map((draft) => draft.reference)),
    addressKeys: drafts.map((draft) => draft.addressKey),
  })
  const matches = matchDrafts(drafts, keys)
  const known = await listKnown(scope, present(matches.map((match) => match.homeId)))
  const plans: MergePlan[] = []
  const clashes: { draft: HomeDraft; why: string }[] = []
  const taken = new Set<string>()
  for (const { draft, homeId, clash } of matches) {
    if (clash !== null) clashes.push({ draft, why: clash })
    else if (homeId !== null && taken.has(homeId))
      clashes.push({ draft, why: 'another row of this file is about the same home in the register' })
    else {
      if (homeId !== null) taken.add(homeId)
      plans.push(mergeDraft(draft, homeId === null ? null : (known.get(homeId) ?? null), nation))
    }
  }
  return { plans, clashes }
}
