'use client'
import { useContext } from 'react'
import { controlClass } from '@/components/ui/field'
import { fieldId, FormContext } from '@/components/ui/form-context'
import { Cell, HeadCell, Row, RowHead, Table } from '@/components/ui/table'
import { IMPORT_FIELD_GROUPS, IMPORT_FIELD_NAMES } from '@/lib/imports/import-field-names'
import { type ImportLayout } from '@/lib/imports/import-layout'

/** A row for each column of the sheet: its heading, its first cells, and what it is. */
export function ColumnChoices({ layout }: { layout: ImportLayout }) {
  const form = useContext(FormContext)
  const fieldAt = new Map(Object.entries(layout.mapping).map(([field, column]) => [column, field]))
  return (
    <Table caption="Columns of the sheet">
      <thead>
        <tr>
          <HeadCell>Heading in your file</HeadCell>
          <HeadCell>First rows</HeadCell>
          <HeadCell>Is read as</HeadCell>
        </tr>
      </thead>
      <tbody>
        {layout.headings.map((heading, column) => {
          const name = `column-${column}`
          const id = fieldId(form?.id ?? '', name)
          const problem = form?.problems.find((one) => one.field === name)?.problem
          const words = heading || `Column ${column + 1}, without a heading`
          return (
            <Row key={name}>
              <RowHead className="min-w-32">{words}</RowHead>
              <Cell className="max-w-72 text-sm text-slate">
                <span className="line-clamp-2">
                  {layout.sample
                    .map((row) => row[column])
                    .filter(Boolean)
                    .slice(0, 4)
                    .join(' · ') || 'nothing'}
                </span>
              </Cell>
              <Cell className="min-w-56">
                <label htmlFor={id} className="sr-only">
                  {words} is read as
                </label>
                <select
                  id={id}
                  name="columns"
                  defaultValue={fieldAt.get(column) ?? ''}
                  aria-invalid={problem ? true : undefined}
                  aria-describedby={problem ? `${id}-problem` : undefined}
                  className={controlClass(problem)}
                >
                  <option value="">Leave out</option>
                  {IMPORT_FIELD_GROUPS.map(([group, fields]) => (
                    <optgroup key={group} label={group}>
                      {fields.map((field) => (
                        <option key={field} value={field}>
                          {IMPORT_FIELD_NAMES[field]}
                        </option>
                      ))}
                    </optgroup>
                  ))}
                </select>
                {problem && (
                  <p id={`${id}-problem`} className="mt-1 font-semibold text-madder">
                    {problem}
                  </p>
                )}
              </Cell>
            </Row>
          )
        })}
      </tbody>
    </Table>
  )
}
