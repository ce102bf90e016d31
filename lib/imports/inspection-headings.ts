/** Which headings speak of electrical inspections: not of gas, fire, energy or anything else that also falls due. */
import { foldWords } from './fold-words'

export type InspectionField = 'last-inspection' | 'next-due' | 'assessment'

const ELECTRICAL =
  /\beicrs?\b|\bpirs?\b|\belec(?:s|trics?|trical|trically|tricity|tr)?\b|\bfixed ?wir\w*|\bhard ?wir\w*|\bperiodic\w*|\bbs ?7671\b|\b(?:5|five) ?y(?:ea)?r(?:ly)?\b|\bcondition report\b|\bwiring (?:test|check|inspection|cert\w*|report)/
const INSTALLATION =
  /\bfuse|\bconsumer unit|\brcds?\b|\bwiring\b|\brewire|\bmcbs?\b|^c ?c? ?u\b|^d ?b\b|^c[123]s?$|^fi$/
const OTHER =
  /\b(?:gas|lgsr|cp ?12|boilers?|heating|heat|epc|energy|sap|asbestos|acm|fire|fra|legionella|l8|water|lifts?|loler|smoke|alarms?|detect\w*|co|co2|carbon|roofs?|kitchens?|bathrooms?|windows?|doors?|damp|mould|pat|appliances?|emergency|lighting|radon|solar|pv|ashp|gshp|hhsrs|decent|scs|stock condition|survey\w*|tenan\w*|occup\w*|let|lettings?|voids?|rents?|valuation|insurance|lease|warranty|dob|birth|move[ds]?|start|end|servic\w*|chimney|flue|oil|solid fuel|paint\w*|cyclical|cctv|aerial|purchase\w*|acqui\w*|sold|handover|refurb\w*|adapt\w*|created|updated|modified|logged|visit\w*|licen[cs]\w*|hmo|deposit|right to rent|inventory|planned|programme|replace\w*|renew\w*|external|loft|cavity|insulation|meter|mpan|suppl\w*|tariff)\b/
/** Columns about an inspection that hold something else than its date or its outcome. */
const ABOUT_IT =
  /\b(?:no|num|number|ref|reference|id|cost|price|fee|contractor|engineer|electrician|company|firm|inspector|booked|appointment|appt|visit\w*|remedials?|repairs?|works?|access|heat\w*|heaters?|meter\w*|suppl\w*|storage|order\w*|raised|jobs?|invoice\w*|link|file|pdf|upload\w*|sent|issued to|received|gas|fire|smoke|alarms?|appliances?|pat|emergency|charg\w*|shower|cooker|hob|attempts?|days|months|interval|frequency|priority|previous|prior|old|letter|previously|prev|vehicle|type|supplier|serial)\b/
const DUE =
  /\bnext\b|\bdue\b|\bexpir\w*|\bexp\b|\bre ?tests?\b|\bre ?inspect\w*|\bvalid\b|\buntil\b|\brenew\w*|\bdeadline\b|\btarget\b/
const DATED =
  /\bdate\w*|\blast\b|\bwhen\b|\bdone\b|\bcomplet\w*|\btest(?:ed|s)?\b|\binspect\w*|\bcheck(?:ed)?\b|\bcert\w*|\breport\b|\bcarried out\b|\bon\b/
const OUTCOME =
  /\bresults?\b|\boutcomes?\b|\bassessment\b|\bpass\b|\bfail\b|\bsat\b|\bunsat\b|\b(?:un)?satisfactory\b|\boverall\b|\bstatus\b|\bcondition\b(?! report)|\brating\b|\bgrade\b|\bverdict\b|\bclassification\b/

const GENERIC: readonly (readonly [RegExp, InspectionField, number])[] = [
  [/^(?:date )?(?:of )?(?:the )?(?:last|latest|most recent) (?:test|inspect(?:ion|ed)|tested|check(?:ed)?|cert\w*|report|certificate)(?: date)?$/, 'last-inspection', 6],
  [/^(?:test|tested|inspection|inspected|cert|certificate|certification|report)(?: date| on)?$|^date (?:of )?(?:test|tested|inspection|inspected|cert|certificate|report)$/, 'last-inspection', 6],
  [/^date$|^last done$|^last date$/, 'last-inspection', 3],
  [/^(?:date )?(?:next )?(?:test |inspection |re ?test |cert\w* |report )?(?:due|next|next due|due date|due on|due by|expiry|expires|expiry date|expires on|due again|retest|re ?test|re ?inspect(?:ion)?|renewal|valid until|valid to)(?: date| due| by| on)*$|^next (?:test|inspection|check|report|cert\w*)(?: date| due)*$|^due for (?:test|retest|inspection)$/, 'next-due', 6],
  [/^(?:overall |test |report |inspection |cert\w* )?(?:result|outcome|assessment|verdict|pass fail|sat unsat|satisfactory|overall condition|condition|satisfactory y n)s?$/, 'assessment', 6],
  [/^status$/, 'assessment', 3],
] // prettier-ignore

export type Subject = 'electrical' | 'other' | null

/** What a heading is about, as far as it says so itself. */
export function subjectOf(heading: string): Subject {
  const words = foldWords(heading)
  if (
    OTHER.test(words) &&
    !/\beicrs?\b|\bpirs?\b|\belec\w* (?:test|cert|inspection|safety|report|check)/.test(words)
  )
    return 'other'
  return ELECTRICAL.test(words) || INSTALLATION.test(words) ? 'electrical' : null
}

export type InspectionGuess = {
  readonly field: InspectionField
  readonly score: number
  readonly generic: boolean
}

/**
 * The inspection fields that a heading may stand for. `generic` says that it names no subject of its own ("Next due").
 * @example inspectionGuesses('EICR date') // [{ field: 'last-inspection', score: 10, generic: false }]
 * @example inspectionGuesses('Gas cert expiry') // []
 */
export function inspectionGuesses(heading: string): readonly InspectionGuess[] {
  const words = foldWords(heading)
  const subject = subjectOf(heading)
  if (subject === 'other') return []
  const generic = GENERIC.filter(([pattern]) => pattern.test(words)).map(([, field, score]) => ({
    field,
    score,
    generic: true,
  }))
  if (!ELECTRICAL.test(words)) return generic
  if (ABOUT_IT.test(words)) return []
  const guess = (field: InspectionField, score: number) => ({ field, score, generic: false })
  if (DUE.test(words)) return [guess('next-due', 10)]
  if (OUTCOME.test(words)) return [guess('assessment', 10)]
  if (/\blast\b|\blatest\b|\bdate\b/.test(words)) return [guess('last-inspection', 10)]
  // "EICR" or "Electrical certificate" alone: its content tells a date from an outcome.
  return DATED.test(words) || words.split(' ').length <= 3
    ? [guess('last-inspection', 8), guess('assessment', 7), guess('next-due', 6)]
    : []
}
