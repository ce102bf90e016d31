import { existsSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { actions, exportsOf, handlers, pages, textOf } from '@/tests/access/entries'
import { EVERYBODY } from '@/tests/access/everybody'
import { ACTIONS, HANDLERS, PAGES } from '@/tests/access/matrix'
import { PERMISSIONS } from '@/lib/access/permission'

const keys = (rows: object) => Object.keys(rows).sort()

describe('the access matrix', () => {
  it('has a row for every page, and no other', () => expect(keys(PAGES)).toEqual(pages().sort()))
  it('has a row for every route handler, and no other', () =>
    expect(keys(HANDLERS)).toEqual(handlers().sort()))
  it('has a row for every action, and no other', () => expect(keys(ACTIONS)).toEqual(actions().sort()))

  it('finds every kind of export, so that none slips by', () => {
    const text = [
      'export const one = action(A, a)',
      'export async function two() {}',
      'export function three() {}',
      'export { handler as GET, other }',
      'export type Four = string',
      'const hidden = 1',
    ].join('\n')
    expect(exportsOf(text)).toEqual(['one', 'two', 'three', 'GET', 'other'])
  })

  it('finds no action outside the files that are called so', () =>
    expect(actions().filter((entry) => !/\/actions\.ts#/.test(entry))).toEqual([]))

  it.each(Object.entries(ACTIONS))('%s calls the use-case of its row', (entry, { useCase }) => {
    const file = entry.split('#')[0] ?? ''
    const session = entry === 'app/actions.ts#signOut' ? textOf('app/session.ts') : ''
    expect(`${textOf(file)}${session}`).toMatch(new RegExp(`\\b${useCase}\\b`))
  })

  it.each(Object.entries(ACTIONS).filter(([, row]) => row.needs))(
    '%s lets in whose role carries its permission',
    (_, row) => {
      const roles: readonly string[] = PERMISSIONS[row.needs!][1]
      const carries = EVERYBODY.filter((one) => roles.includes(one.split(' ')[0]!))
      expect([...row.lets, ...(row.hides ?? [])].sort()).toEqual([...carries].sort())
    },
  )

  it.each(Object.entries(ACTIONS).filter(([, row]) => !row.needs))(
    '%s is tried by a test of its own',
    (_, { triedIn, useCase }) => {
      expect(existsSync(triedIn ?? '')).toBe(true)
      expect(textOf(triedIn ?? '')).toContain(useCase)
    },
  )
})
