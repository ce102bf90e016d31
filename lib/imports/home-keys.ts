/** The keys of the homes accepted so far, to find the same home twice in one file. Only keys are kept in memory. */
import { type HomeDraft } from './home-draft'

type Kept = { readonly row: number; readonly uprn: string | null; readonly reference: string | null }

/** The register does not tell the case of a reference apart either. */
const referenceOf = ({ reference }: HomeDraft) => reference?.toLowerCase() ?? null

const differ = (one: string | null, other: string | null) => one !== null && other !== null && one !== other

export class HomeKeys {
  private readonly byUprn = new Map<string, number>()
  private readonly byReference = new Map<string, number>()
  private readonly byAddress = new Map<string, Kept>()

  /**
   * Why a draft clashes with a home accepted before, or null. Two rows with one address are the same home unless
   * both a UPRN or both a reference tell them apart.
   * @example new HomeKeys().clash(draft) // null
   */
  clash(draft: HomeDraft): string | null {
    const reference = referenceOf(draft)
    const there = this.byAddress.get(draft.addressKey)
    if (there) {
      const sameUprn = draft.uprn !== null && draft.uprn === there.uprn
      const apart = differ(draft.uprn, there.uprn) || (!sameUprn && differ(reference, there.reference))
      return apart ? `address already used in row ${there.row}` : `same home as row ${there.row}`
    }
    const byUprn = draft.uprn === null ? undefined : this.byUprn.get(draft.uprn)
    if (byUprn !== undefined) return `UPRN already used in row ${byUprn}`
    const byReference = reference === null ? undefined : this.byReference.get(reference)
    return byReference === undefined ? null : `reference already used in row ${byReference}`
  }

  /** Keeps the keys of an accepted home. A rejected row reserves nothing, so a later good row of that home is taken. */
  add(draft: HomeDraft): void {
    const reference = referenceOf(draft)
    if (draft.uprn !== null) this.byUprn.set(draft.uprn, draft.row)
    if (reference !== null) this.byReference.set(reference, draft.row)
    this.byAddress.set(draft.addressKey, { row: draft.row, uprn: draft.uprn, reference })
  }
}
