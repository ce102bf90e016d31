/** Finds, for each draft, the home of the register that it is about: by UPRN, then reference, then address. */
import { type HomeDraft } from './home-draft'

/** How a home can be recognised. */
export type HomeKeys = {
  readonly id: string
  readonly uprn: string | null
  readonly reference: string | null
  readonly addressKey: string
}

export type Match = {
  readonly draft: HomeDraft
  readonly homeId: string | null
  readonly clash: string | null
}

const agree = (a: string | null, b: string | null) => a === null || b === null || a === b

/**
 * Matches drafts with homes. A draft whose UPRN and reference belong to two different homes is a clash.
 * An address alone matches only where neither side's UPRN or reference speaks against it: flats may share one.
 */
export function matchDrafts(drafts: readonly HomeDraft[], homes: readonly HomeKeys[]): readonly Match[] {
  const byUprn = new Map<string, HomeKeys>()
  const byReference = new Map<string, HomeKeys>()
  const byAddress = new Map<string, HomeKeys[]>()
  for (const home of homes) {
    if (home.uprn) byUprn.set(home.uprn, home)
    if (home.reference) byReference.set(home.reference.toLowerCase(), home)
    byAddress.set(home.addressKey, [...(byAddress.get(home.addressKey) ?? []), home])
  }
  return drafts.map((draft) => {
    const uprn = draft.uprn === null ? undefined : byUprn.get(draft.uprn)
    const reference = draft.reference === null ? undefined : byReference.get(draft.reference.toLowerCase())
    if (uprn && reference && uprn.id !== reference.id)
      return {
        draft,
        homeId: null,
        clash: 'its UPRN and its reference belong to two different homes in the register',
      }
    const address = byAddress
      .get(draft.addressKey)
      ?.find((home) => agree(home.uprn, draft.uprn) && agree(home.reference, draft.reference))
    return { draft, homeId: (uprn ?? reference ?? address)?.id ?? null, clash: null }
  })
}
