/** What the provider's own stock list says of a home. */
import { addressKey } from '@/lib/imports/address-key'
import { type HomeDraft } from '@/lib/imports/home-draft'
import { UNKNOWN_YEAR } from '@/lib/homes/year-built'

type Given = Partial<HomeDraft> & Pick<HomeDraft, 'row' | 'address' | 'postcode' | 'tenure'>

/** A row of a stock list: what is not given is not known. */
export function draftOf(given: Given): HomeDraft {
  const draft = {
    kind: 'dwelling' as const,
    reference: null,
    uprn: null,
    town: null,
    block: null,
    patch: null,
    nation: null,
    built: UNKNOWN_YEAR,
    dwellingType: 'unknown' as const,
    bedrooms: null,
    boardType: 'unknown' as const,
    rcdCover: 'unknown' as const,
    ways: null,
    wiring: 'unknown' as const,
    rewired: null,
    inspectionRecord: 'unknown' as const,
    lastInspection: null,
    assessment: null,
    nextDue: null,
    open: { C1: null, C2: null, C3: null, FI: null },
    latitude: null,
    longitude: null,
    note: null,
    ...given,
  }
  return { ...draft, addressKey: addressKey(draft) }
}
