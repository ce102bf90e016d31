import { describe, expect, it } from 'vitest'
import { type Actor } from '@/lib/access/actor'
import { can, demand, reaches } from '@/lib/access/can'
import { type Permission, PERMISSIONS } from '@/lib/access/permission'
import { reachOf } from '@/lib/access/reach'
import { type Role, ROLE_NAMES, ROLES } from '@/lib/access/role'
import { NotAllowed, NotFound } from '@/lib/errors/expected'

const actor = (role: Role, patches: Actor['patches'] = 'all'): Actor => ({
  personId: 'p',
  name: 'Ines Quill',
  email: 'ines@harrowgate.example',
  organisationId: 'o',
  organisationName: 'Harrowgate Homes',
  role,
  patches,
})

/**
 * Who may do what, written out by hand from the product's table of people: m manager, o officer,
 * a auditor, s contractor's supervisor, e electrician; a dot means no.
 */
const EXPECTED: Record<Permission, string> = {
  'homes.read': 'm o a . .',
  'homes.edit': 'm o . . .',
  'homes.add': 'm . . . .',
  'homes.export': 'm o a . .',
  'imports.read': 'm . a . .',
  'imports.run': 'm . . . .',
  'people.read': 'm . a . .',
  'people.manage': 'm . . . .',
  'organisation.read': 'm . a . .',
  'organisation.manage': 'm . . . .',
  'audit.read': 'm . a . .',
  'method.read': 'm o a . .',
  'visits.read': '. . . s e',
}
const LETTERS = ['m', 'o', 'a', 's', 'e']
const table = (Object.entries(EXPECTED) as [Permission, string][]).flatMap(([permission, row]) =>
  row.split(' ').map((letter, at) => [ROLES[at] as Role, permission, letter === LETTERS[at]] as const),
)

describe('permissions', () => {
  it('has a row here for every permission and a column for every role', () => {
    expect(Object.keys(EXPECTED).sort()).toEqual(Object.keys(PERMISSIONS).sort())
    expect(table).toHaveLength(Object.keys(PERMISSIONS).length * ROLES.length)
    expect(Object.keys(ROLE_NAMES)).toEqual([...ROLES])
  })

  it.each(table)('%s, %s: %s', (role, permission, allowed) => {
    expect(can(actor(role), permission)).toBe(allowed)
    if (allowed) expect(() => demand(actor(role), permission)).not.toThrow()
    else expect(() => demand(actor(role), permission)).toThrow(NotAllowed)
  })

  it('lets an auditor change nothing', () => {
    const changes = (Object.keys(PERMISSIONS) as Permission[]).filter((one) =>
      /\.(edit|add|run|manage)$/.test(one),
    )
    expect(changes.filter((one) => can(actor('auditor'), one))).toEqual([])
    expect(changes.length).toBeGreaterThan(4)
  })
})

describe('reach', () => {
  it.each([
    ['all', 'north', true],
    ['all', null, true],
    [['north'], 'north', true],
    [['north', 'mill'], 'mill', true],
    [['north'], 'mill', false],
    [['north'], null, false],
    [[], 'north', false],
    [[], null, false],
  ] as const)('patches %j and a home in patch %j: %s', (patches, patchId, reached) => {
    expect(reaches(actor('officer', patches), { patchId })).toBe(reached)
    expect(reachOf(actor('officer', patches))).toEqual(patches)
  })

  it('hides a home of another patch as if it were not there', () => {
    const officer = actor('officer', ['north'])
    expect(() => demand(officer, 'homes.edit', { patchId: 'mill' })).toThrow(NotFound)
    expect(() => demand(officer, 'homes.edit', { patchId: null })).toThrow(NotFound)
    expect(() => demand(officer, 'homes.edit', { patchId: 'north' })).not.toThrow()
  })

  it('tells a person without the permission nothing about where the home lies', () => {
    const auditor = actor('auditor', ['north'])
    expect(() => demand(auditor, 'homes.edit', { patchId: 'mill' })).toThrow(NotAllowed)
    expect(() => demand(auditor, 'homes.edit', { patchId: 'north' })).toThrow(NotAllowed)
  })
})
