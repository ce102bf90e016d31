/**
 * What an import changes of one home: the draft of its row beside what the register already holds.
 * A file never un-knows a fact, never overrules an inspection or an officer, and never closes a defect.
 */
import { builtToText } from '@/lib/homes/built-text'
import { CLASSIFICATION_CODES, type ClassificationCode } from '@/lib/homes/classification-code'
import { type FactKind, FACT_NAMES } from '@/lib/homes/fact'
import { foldName } from '@/lib/homes/fold-name'
import { type Nation } from '@/lib/homes/nation'
import { type HomeDraft } from './home-draft'
import { type HomeIdentity, type KnownHome, type KnownInspection } from './known-home'

export type FactChange = {
  readonly kind: FactKind
  readonly value: string
  readonly supersedes: string | null
}

export type MergePlan = {
  readonly draft: HomeDraft
  readonly known: KnownHome | null
  readonly identity: HomeIdentity
  /** fields of the identity that change, with the words of before and after; empty for a new home */
  readonly changes: readonly {
    readonly field: keyof HomeIdentity
    readonly from: string
    readonly to: string
  }[]
  readonly facts: readonly FactChange[]
  readonly inspection: Omit<KnownInspection, 'id' | 'source'> | null
  /** an inspection of the same day, from an earlier import, that this one corrects */
  readonly withdraws: string | null
  readonly defects: Readonly<Record<ClassificationCode, number>>
  /** where the register's own word was kept against the file's */
  readonly kept: readonly string[]
}

/** The text values of a draft's facts; only what it knows. */
export function factsOfDraft(draft: HomeDraft): readonly (readonly [FactKind, string])[] {
  const facts: [FactKind, string][] = []
  const add = (kind: FactKind, value: string | number | null) => {
    if (value !== null && value !== 'unknown') facts.push([kind, String(value)])
  }
  add('board-type', draft.boardType)
  add('rcd-cover', draft.rcdCover)
  add('ways', draft.ways)
  add('wiring', draft.wiring)
  add('rewired', draft.rewired)
  if (draft.built.from !== null || draft.built.to !== null) add('built', builtToText(draft.built))
  add('dwelling-type', draft.dwellingType)
  add('bedrooms', draft.bedrooms)
  if (draft.inspectionRecord === 'never') add('inspection-record', 'never')
  return facts
}

function identityOf(draft: HomeDraft, known: KnownHome | null, nation: Nation): HomeIdentity {
  const was = known?.identity
  return {
    kind: draft.kind,
    reference: draft.reference ?? was?.reference ?? null,
    uprn: draft.uprn ?? was?.uprn ?? null,
    address: draft.address,
    town: draft.town ?? was?.town ?? null,
    postcode: draft.postcode ?? was?.postcode ?? null,
    addressKey: draft.addressKey,
    nation: draft.nation ?? was?.nation ?? nation,
    tenure: draft.tenure === 'unknown' && was ? was.tenure : draft.tenure,
    patch: draft.patch ?? was?.patch ?? null,
    block: draft.block ?? was?.block ?? null,
    latitude: draft.latitude ?? was?.latitude ?? null,
    longitude: draft.longitude ?? was?.longitude ?? null,
    note: draft.note ?? was?.note ?? null,
  }
}

/** Positions are kept to six decimals, so two that differ by less are the same; names differ by more than case. */
function same(field: keyof HomeIdentity, a: string | number | null, b: string | number | null): boolean {
  if (typeof a === 'number' && typeof b === 'number') return Math.abs(a - b) < 0.000_001
  if ((field === 'patch' || field === 'block') && a !== null && b !== null)
    return foldName(String(a)) === foldName(String(b))
  return a === b
}

function inspectionOf(draft: HomeDraft, known: KnownHome | null) {
  if (!draft.lastInspection) return { inspection: null, withdraws: null }
  const inspection = {
    inspectedOn: draft.lastInspection,
    assessment: draft.assessment,
    nextDueOn: draft.nextDue,
  }
  const twin = known?.inspections.find(({ inspectedOn }) => inspectedOn.day === draft.lastInspection?.day)
  if (!twin) return { inspection, withdraws: null }
  const merged = {
    ...inspection,
    assessment: draft.assessment ?? twin.assessment,
    nextDueOn: draft.nextDue ?? twin.nextDueOn,
  }
  const unchanged =
    twin.source !== 'import' ||
    (twin.inspectedOn.precision === merged.inspectedOn.precision &&
      twin.assessment === merged.assessment &&
      twin.nextDueOn === merged.nextDueOn)
  return unchanged ? { inspection: null, withdraws: null } : { inspection: merged, withdraws: twin.id }
}

/**
 * Decides what one row changes.
 * @param nation the nation of a new home where the file does not say
 * @example mergeDraft(draft, null, 'england').facts // [{ kind: 'board-type', value: 'rewireable', supersedes: null }, ...]
 */
export function mergeDraft(draft: HomeDraft, known: KnownHome | null, nation: Nation): MergePlan {
  const identity = identityOf(draft, known, nation)
  const kept: string[] = []
  const facts: FactChange[] = []
  for (const [kind, value] of factsOfDraft(draft)) {
    const current = known?.facts.get(kind)
    if (current?.value === value) continue
    if (current && (current.source === 'inspection' || current.source === 'officer'))
      kept.push(FACT_NAMES[kind])
    else facts.push({ kind, value, supersedes: current?.id ?? null })
  }
  const defects = Object.fromEntries(
    CLASSIFICATION_CODES.map((code) => {
      const missing = (draft.open[code] ?? 0) - (known?.openDefects[code] ?? 0)
      if (draft.open[code] !== null && missing < 0) kept.push(`open ${code}`)
      return [code, Math.max(0, missing)]
    }),
  ) as Record<ClassificationCode, number>
  const changes = known
    ? (Object.keys(identity) as (keyof HomeIdentity)[])
        .filter((field) => !same(field, identity[field], known.identity[field]))
        .map((field) => ({
          field,
          from: String(known.identity[field] ?? 'nothing'),
          to: String(identity[field] ?? 'nothing'),
        }))
    : []
  return { draft, known, identity, changes, facts, ...inspectionOf(draft, known), defects, kept }
}

/** Whether a plan changes anything of a home that is already known. */
export const changesAnything = (plan: MergePlan): boolean =>
  plan.changes.length > 0 ||
  plan.facts.length > 0 ||
  plan.inspection !== null ||
  CLASSIFICATION_CODES.some((code) => plan.defects[code] > 0)
