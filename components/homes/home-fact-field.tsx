'use client'
import { useContext } from 'react'
import { FormContext } from '@/components/ui/form-context'
import { Notice } from '@/components/ui/notice'
import { SelectField } from '@/components/ui/select-field'
import { TextField } from '@/components/ui/text-field'
import { FACT_NAMES, type FactKind } from '@/lib/homes/fact'
import { factValueInWords } from '@/lib/homes/fact-value'
import { FACT_CHOICES } from './home-fact-choices'
import { dateWithPrecision } from './home-provenance'
import { type FactHistoryShown } from './home-shown'
import {
  CHOSEN_KINDS,
  type ChosenKind,
  fieldValue,
  isTouched,
  seenField,
  type TypedKind,
  wasField,
} from './home-touched-facts'
import { WaysField } from './home-ways-field'
import { momentInWords, SOURCE_NAMES } from './home-words'

const TYPED_HINTS: Record<TypedKind, string> = {
  ways: 'One letter a way. Leave it empty if nobody has counted them.',
  rewired: 'The year. Leave it empty if it is not known.',
  built: 'A year, or a span: 1931, 1960/1969, ~1900 for about, ../1939 for up to. Empty: not known.',
  bedrooms: 'Leave it empty if it is not known.',
}

const isChosen = (kind: FactKind): kind is ChosenKind => (CHOSEN_KINDS as readonly FactKind[]).includes(kind)
const inWords = (kind: FactKind, typed: string) =>
  factValueInWords(kind, typed === '' || typed === 'unknown' ? null : typed)

function onRecord({ kind, current }: FactHistoryShown): string {
  if (current === null) return 'Nothing on record.'
  return `On record: ${factValueInWords(kind, current.value)} (${SOURCE_NAMES[current.source].toLowerCase()}, ${dateWithPrecision(current.asOf)}).`
}

/** Where another person changed the fact between the opening of the page and the sending of the form: both values. */
function ChangedMeanwhile({ fact: { kind, current } }: { fact: FactHistoryShown }) {
  const form = useContext(FormContext)
  const was = form?.values?.[wasField(kind)]
  const now = fieldValue(kind, current?.value ?? null)
  if (typeof was !== 'string' || was === now) return null
  const typed = form?.values?.[kind]
  const mine = typeof typed === 'string' && typed !== now ? typed : null
  return (
    <Notice
      tone="amber"
      title={`${FACT_NAMES[kind]} has changed since you opened this page`}
      className="mb-2"
    >
      It was {inWords(kind, was)}. {current?.recordedBy ?? 'Somebody else'} put {inWords(kind, now)} on record
      {current && ` ${momentInWords(current.recordedAt)}`}.{' '}
      {mine === null
        ? 'The field below holds that now.'
        : `You chose ${inWords(kind, mine)}: send it again to put yours in its place, or change it.`}
    </Notice>
  )
}

/** One fact to correct: what is on record of it, and what it is to be. */
export function FactField({ fact }: { fact: FactHistoryShown }) {
  const { kind, current } = fact
  const value = fieldValue(kind, current?.value ?? null)
  const form = useContext(FormContext)
  return (
    <div>
      <input type="hidden" name={wasField(kind)} value={value} />
      <input type="hidden" name={seenField(kind)} value={current?.id ?? ''} />
      <ChangedMeanwhile fact={fact} />
      {isChosen(kind) ? (
        <SelectField
          name={kind}
          label={FACT_NAMES[kind]}
          hint={onRecord(fact)}
          choices={FACT_CHOICES[kind]}
          defaultValue={value}
          width="medium"
        />
      ) : kind === 'ways' ? (
        <WaysField
          key={String(form?.values?.ways)}
          defaultValue={value}
          hint={`${TYPED_HINTS.ways} ${onRecord(fact)}`}
        />
      ) : (
        <TextField
          name={kind}
          label={FACT_NAMES[kind]}
          hint={`${TYPED_HINTS[kind]} ${onRecord(fact)}`}
          defaultValue={value}
          width={kind === 'built' ? 'short' : 'tiny'}
          inputMode={kind === 'built' ? 'text' : 'numeric'}
          autoComplete="off"
          mono
        />
      )}
    </div>
  )
}

/** The form's values with the facts that nobody touched brought up to date: what was typed stays, what was not follows. */
export function withFreshFacts(
  values: Readonly<Record<string, string | readonly string[] | undefined>>,
  facts: readonly FactHistoryShown[],
): Readonly<Record<string, string | readonly string[] | undefined>> {
  const fresh = facts
    .filter(({ kind }) => !isTouched(values, kind))
    .map(({ kind, current }) => [kind, fieldValue(kind, current?.value ?? null)])
  return { ...values, ...Object.fromEntries(fresh) }
}
