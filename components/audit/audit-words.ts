/** What each kind of entry of the audit trail says, in words. */
const WORDS: Record<string, string> = {
  'home.added': 'Added a home',
  'home.changed': 'Changed a home’s address or tenure',
  'home.fact-recorded': 'Corrected a fact of a home',
  'home.inspection-recorded': 'Recorded an inspection',
  'home.defect-added': 'Added a defect',
  'home.defect-closed': 'Closed a defect',
  'homes.exported': 'Took a list of homes away as a file',
  'import.uploaded': 'Uploaded a stock list',
  'import.confirmed': 'Confirmed an import',
  'import.taken-in': 'An import was taken in',
  'import.cancelled': 'Cancelled an import',
  'invitation.accepted': 'Accepted an invitation',
  'invitation.sent': 'Invited somebody',
  'invitation.sent-again': 'Sent an invitation again',
  'invitation.withdrawn': 'Withdrew an invitation',
  'organisation.settings-changed': 'Changed the organisation’s settings',
  'organisation.signed-up': 'The organisation signed up',
  'patch.added': 'Added a patch',
  'patch.renamed': 'Renamed a patch',
  'person.access-changed': 'Changed somebody’s role or patches',
  'person.access-ended': 'Ended somebody’s access',
  'person.password-changed': 'Somebody changed their password',
}

/**
 * An entry in words; one that has no words of its own is shown by its name.
 * @example entryInWords('home.added') // 'Added a home'
 */
export const entryInWords = (did: string): string =>
  WORDS[did] ?? did.replace(/[.-]/g, ' ').replace(/^./, (letter) => letter.toUpperCase())

/** The detail of an entry on one line: "rows: 642, rejected: 10". */
export const detailInWords = (detail: Readonly<Record<string, unknown>>): string =>
  Object.entries(detail)
    .map(([name, value]) => `${name}: ${typeof value === 'object' ? JSON.stringify(value) : String(value)}`)
    .join(', ')
