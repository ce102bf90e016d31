'use client'
import { RadioGroup } from '@/components/ui/choice-group'
import { type Choice, SelectField } from '@/components/ui/select-field'
import { TextAreaField } from '@/components/ui/text-area-field'
import { TextField } from '@/components/ui/text-field'
import { type HomeRow } from '@/lib/homes/home-row'
import { NATION_CHOICES, TENURE_CHOICES } from './home-fact-choices'

/** Address, town and postcode: the least that tells a home from another. */
export function AddressFields({ home }: { home?: Pick<HomeRow, 'address' | 'town' | 'postcode'> }) {
  return (
    <>
      <TextField
        name="address"
        label="Address"
        hint="The first lines, without town and postcode."
        defaultValue={home?.address}
        maxLength={200}
        autoComplete="off"
      />
      <TextField
        name="town"
        label="Town"
        defaultValue={home?.town ?? ''}
        maxLength={120}
        width="medium"
        autoComplete="off"
        optional
      />
      <TextField
        name="postcode"
        label="Postcode"
        defaultValue={home?.postcode ?? ''}
        width="tiny"
        className="uppercase"
        autoComplete="off"
        spellCheck={false}
        optional
      />
    </>
  )
}

/** The nation, whose law sets the duty, and how the home is held. */
export function DutyFields({ home }: { home?: Pick<HomeRow, 'nation' | 'tenure'> }) {
  return (
    <>
      <RadioGroup
        name="nation"
        legend="Nation"
        hint="Its law says how often the home is inspected. Some postcodes lie on both sides of a border."
        choices={NATION_CHOICES}
        defaultValue={home?.nation}
      />
      <SelectField
        name="tenure"
        label="How it is held"
        choices={TENURE_CHOICES}
        defaultValue={home?.tenure ?? 'unknown'}
        width="medium"
      />
    </>
  )
}

/** What an organisation files a home under. */
export function FilingFields({ home, patches }: { home?: HomeRow; patches: readonly Choice[] }) {
  return (
    <>
      {patches.length > 0 && (
        <SelectField
          name="patch"
          label="Patch"
          hint="Who answers for it follows from the patch."
          choices={patches}
          defaultValue={home?.patch?.id ?? (home ? 'none' : patches[0]?.value)}
          width="medium"
        />
      )}
      <TextField
        name="block"
        label="Block"
        hint="The building, where it has several homes. A name that is new makes a new block."
        defaultValue={home?.block?.name ?? ''}
        maxLength={160}
        optional
      />
      <TextField
        name="reference"
        label="Your own reference"
        defaultValue={home?.reference ?? ''}
        maxLength={60}
        width="medium"
        autoComplete="off"
        mono
        optional
      />
      <TextField
        name="uprn"
        label="UPRN"
        hint="The property’s number in the national register, up to 12 figures."
        defaultValue={home?.uprn ?? ''}
        width="short"
        inputMode="numeric"
        autoComplete="off"
        mono
        optional
      />
    </>
  )
}

/** Where it lies on the map, in degrees. */
export function PositionFields({ place }: { place?: HomeRow['place'] }) {
  return (
    <div className="flex flex-wrap gap-x-6">
      <TextField
        name="latitude"
        label="Latitude"
        hint="Degrees north"
        defaultValue={place ? String(place.latitude) : ''}
        width="short"
        inputMode="decimal"
        autoComplete="off"
        mono
        optional
      />
      <TextField
        name="longitude"
        label="Longitude"
        hint="Degrees east; west is below 0"
        defaultValue={place ? String(place.longitude) : ''}
        width="short"
        autoComplete="off"
        mono
        optional
      />
    </div>
  )
}

export function NoteField({ note }: { note?: string | null }) {
  return (
    <TextAreaField
      name="note"
      label="Note"
      hint="For your colleagues: where the meter is, which door. No personal matters of the people at home."
      defaultValue={note ?? ''}
      maxLength={500}
      className="max-w-reading"
      optional
    />
  )
}
