'use client'
import { useRouter } from 'next/navigation'
import { type SubmitEvent, useId } from 'react'
import { Button } from '@/components/ui/button'
import { ChoiceRow } from '@/components/ui/choice-row'
import { FilterChip } from '@/components/ui/filter-chip'
import { Popover } from '@/components/ui/popover'
import { TextField } from '@/components/ui/text-field'
import {
  FILTER_NAMES,
  type FilterChoice,
  filtersOn,
  listAddress,
  type ListFilter,
} from '@/lib/homes/filter-names'
import { type HomeQuery, homeQueryOf } from '@/lib/homes/home-query'

type Choices = Readonly<Record<ListFilter, readonly FilterChoice[]>>
type PickerProps = { filter: ListFilter; query: HomeQuery; choices: readonly FilterChoice[]; path: string }

/** One filter: tick what is wanted; the address of the page holds it. */
function FilterPicker({ filter, query, choices, path }: PickerProps) {
  const router = useRouter()
  const id = useId()
  const chosen: readonly string[] = query[filter]
  return (
    <Popover trigger={FILTER_NAMES[filter]} label={FILTER_NAMES[filter]} active={chosen.length > 0}>
      {(close) => (
        <form
          onSubmit={(event: SubmitEvent<HTMLFormElement>) => {
            event.preventDefault()
            const values = new FormData(event.currentTarget).getAll(filter).map(String)
            router.push(listAddress(query, { [filter]: homeQueryOf({ [filter]: values })[filter] }, path), {
              scroll: false,
            })
            close()
          }}
        >
          <div className="max-h-72 overflow-y-auto">
            {choices.map(({ value, label, homes }, index) => (
              <ChoiceRow
                key={value}
                type="checkbox"
                id={`${id}-${index}`}
                name={filter}
                value={value}
                defaultChecked={chosen.includes(value)}
                label={homes === undefined ? label : `${label} (${homes.toLocaleString('en-GB')})`}
              />
            ))}
          </div>
          <Button type="submit" size="compact" className="mt-3 w-full">
            Show these homes
          </Button>
        </form>
      )}
    </Popover>
  )
}

/** From one year to another, either left open. */
function BuiltPicker({ query, path }: { query: HomeQuery; path: string }) {
  const router = useRouter()
  return (
    <Popover
      trigger="Built"
      label="Built"
      active={query.builtFrom !== undefined || query.builtTo !== undefined}
    >
      {(close) => (
        <form
          onSubmit={(event: SubmitEvent<HTMLFormElement>) => {
            event.preventDefault()
            const form = new FormData(event.currentTarget)
            const { builtFrom, builtTo } = homeQueryOf({
              builtFrom: String(form.get('from')),
              builtTo: String(form.get('to')),
            })
            router.push(listAddress(query, { builtFrom, builtTo }, path), { scroll: false })
            close()
          }}
        >
          <div className="flex gap-4">
            <TextField
              name="from"
              label="From"
              inputMode="numeric"
              width="tiny"
              defaultValue={String(query.builtFrom ?? '')}
            />
            <TextField
              name="to"
              label="To"
              inputMode="numeric"
              width="tiny"
              defaultValue={String(query.builtTo ?? '')}
            />
          </div>
          <Button type="submit" size="compact" className="w-full">
            Show these homes
          </Button>
        </form>
      )}
    </Popover>
  )
}

const ORDER: readonly ListFilter[] = [
  'board',
  'patch',
  'standing',
  'cover',
  'defects',
  'tenure',
  'block',
  'nation',
  'duty',
]

/** The filters of a list of homes: those that are on, and those that can be put on. */
export function ListFilters({
  query,
  choices,
  path = '/homes',
}: {
  query: HomeQuery
  choices: Choices
  path?: string
}) {
  const on = filtersOn(query, choices)
  return (
    <div className="no-print flex flex-col gap-2" role="group" aria-label="Filters">
      <div className="flex flex-wrap gap-2">
        {ORDER.filter((filter) => choices[filter].length > 1 || query[filter].length > 0).map((filter) => (
          <FilterPicker
            key={`${filter} ${query[filter].join()}`}
            filter={filter}
            query={query}
            choices={choices[filter]}
            path={path}
          />
        ))}
        <BuiltPicker query={query} path={path} />
      </div>
      {on.length > 0 && (
        <div className="flex flex-wrap gap-2">
          {on.map(({ key, label, off }) => (
            <FilterChip key={key} href={listAddress(query, off, path)}>
              {label}
            </FilterChip>
          ))}
        </div>
      )}
    </div>
  )
}
