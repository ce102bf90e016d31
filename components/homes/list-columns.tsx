'use client'
import { useRouter } from 'next/navigation'
import { type SubmitEvent, useId } from 'react'
import { Button } from '@/components/ui/button'
import { ChoiceRow } from '@/components/ui/choice-row'
import { Popover } from '@/components/ui/popover'
import { listAddress } from '@/lib/homes/filter-names'
import { type HomeQuery, COLUMNS, homeQueryOf } from '@/lib/homes/home-query'
import { COLUMN_NAMES } from '@/lib/homes/column-names'

/** Which columns the list shows; the address holds that too. */
export function ListColumns({ query }: { query: HomeQuery }) {
  const router = useRouter()
  const id = useId()
  return (
    <Popover trigger="Columns" label="Columns" align="end">
      {(close) => (
        <form
          onSubmit={(event: SubmitEvent<HTMLFormElement>) => {
            event.preventDefault()
            const columns = new FormData(event.currentTarget).getAll('columns').map(String)
            router.push(listAddress(query, { columns: homeQueryOf({ columns }).columns }), { scroll: false })
            close()
          }}
        >
          <div className="max-h-80 overflow-y-auto">
            {COLUMNS.map((column) => (
              <ChoiceRow
                key={column}
                type="checkbox"
                id={`${id}-${column}`}
                name="columns"
                value={column}
                defaultChecked={query.columns.includes(column)}
                label={COLUMN_NAMES[column]}
              />
            ))}
          </div>
          <Button type="submit" size="compact" className="mt-3 w-full">
            Show these columns
          </Button>
        </form>
      )}
    </Popover>
  )
}
