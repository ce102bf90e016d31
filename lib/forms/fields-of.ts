/** The fields of a sent form or of a query. */
export type Fields = Record<string, FormDataEntryValue | FormDataEntryValue[]>

/**
 * Gathers entries by name: a name that comes once is one value, a name that comes again is a list.
 * The framework's own hidden entries are left out.
 * @example fieldsOf([['a', '1'], ['b', '2'], ['b', '3']]) // { a: '1', b: ['2', '3'] }
 */
export function fieldsOf(entries: Iterable<readonly [string, FormDataEntryValue]>): Fields {
  const fields = Object.create(null) as Fields
  for (const [name, value] of entries) {
    if (name.startsWith('$ACTION')) continue
    const before = fields[name]
    fields[name] = before === undefined ? value : Array.isArray(before) ? [...before, value] : [before, value]
  }
  return { ...fields }
}
