import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { fieldsOf } from '@/lib/forms/fields-of'
import { listOf } from '@/lib/forms/list-of'
import { oneLine } from '@/lib/forms/one-line'
import { problemsOf } from '@/lib/forms/problems-of'
import { typedValues } from '@/lib/forms/typed-values'

describe('the fields of a form', () => {
  it('are gathered by name, without the framework’s own', () => {
    const form = new FormData()
    for (const [name, value] of [
      ['a', '1'],
      ['b', '2'],
      ['b', '3'],
      ['b', '4'],
      ['$ACTION_ID_x', ''],
    ] as const)
      form.append(name, value)
    expect(fieldsOf(form.entries())).toEqual({ a: '1', b: ['2', '3', '4'] })
  })

  it('never reach an object’s prototype', () => {
    const fields = fieldsOf([['__proto__', 'x']])
    expect(Object.getPrototypeOf(fields)).toBe(Object.prototype)
    expect(({} as Record<string, unknown>).x).toBeUndefined()
  })

  it('go back to the person without passwords and files', () => {
    const fields = {
      email: 'a@b.example',
      password: 'x',
      currentPassword: 'y',
      patchIds: ['p', 'q'],
      file: new File([''], 'a.csv'),
    }
    expect(typedValues(fields)).toEqual({ email: 'a@b.example', patchIds: ['p', 'q'] })
  })

  it('that may come many times are always a list', () => {
    const List = listOf(z.string())
    expect([undefined, 'a', ['a', 'b']].map((given) => List.parse(given))).toEqual([[], ['a'], ['a', 'b']])
  })

  it('of one line lose control characters and blanks at their ends', () => {
    const Name = oneLine('Enter a name.', 10)
    expect(Name.parse('  Pat\r\nBcc: x ')).toBe('Pat Bcc: x')
    expect(problemsOf(Name.safeParse(' \n ').error!)).toEqual([{ field: '', problem: 'Enter a name.' }])
    expect(Name.safeParse('eleven chars').error?.issues[0]?.message).toBe('Use 10 characters or fewer.')
  })
})

describe('the problems of a form', () => {
  it('are all there, one a field, in our words', () => {
    const Schema = z.object({
      name: z.string(),
      days: z.string().regex(/^\d+$/, 'Enter a number of days.').max(3),
      role: z.enum(['manager', 'officer'], { error: 'Choose a role.' }),
      kind: z.enum(['a', 'b']),
    })
    const { error } = Schema.safeParse({ days: 'many', role: 'king', kind: 'c' })
    expect(problemsOf(error!)).toEqual([
      { field: 'name', problem: 'Fill this in.' },
      { field: 'days', problem: 'Enter a number of days.' },
      { field: 'role', problem: 'Choose a role.' },
      { field: 'kind', problem: 'That is not one of the values this can take.' },
    ])
  })
})
