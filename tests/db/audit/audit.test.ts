/** The audit trail: one unbroken chain an organisation, whatever writes at once; and every tampering is found. */
import { beforeEach, describe, expect, inject, it } from 'vitest'
import { inTransaction, reading } from '@/db/connection'
import { openPool } from '@/db/knex'
import * as audit from '@/db/repositories/audit'
import { type AnOrganisation, anOrganisation } from '@/tests/builders/an-organisation'

let own: AnOrganisation
const write = (detail: Record<string, unknown> = {}) =>
  inTransaction(own.manager, (scope) =>
    audit.record(scope, {
      actorId: own.manager.personId,
      did: 'home.fact-recorded',
      subjectKind: 'home',
      subjectId: 'h',
      detail,
    }),
  )
const verdict = () => audit.verify(reading(own.manager))

/** As somebody with the schema owner's password would, past the application. */
async function tamper(sql: string, bindings: string[]): Promise<void> {
  const address = Object.assign(new URL(inject('databases').migrate), {
    pathname: new URL(process.env.DATABASE_URL ?? '').pathname,
  })
  const owner = openPool(address.href, 1)
  await owner.raw(sql, bindings)
  await owner.destroy()
}

beforeEach(async () => {
  own = await anOrganisation()
})

describe('the audit trail', () => {
  it('is unbroken when many write at once', async () => {
    await Promise.all(Array.from({ length: 24 }, (_, n) => write({ n })))
    expect(await verdict()).toEqual({ entries: 24, broken: null })
  })

  it('has no entry of a change that was rolled back', async () => {
    const failing = inTransaction(own.manager, async (scope) => {
      await audit.record(scope, { actorId: null, did: 'x', subjectKind: 'home', subjectId: 'h' })
      throw new Error('no')
    })
    await expect(failing).rejects.toThrow('no')
    expect(await verdict()).toEqual({ entries: 0, broken: null })
  })

  it.each([
    [
      'a changed entry',
      `update audit_entries set detail = '{"n":9}' where organisation_id = ? and sequence = 2`,
      2,
      'content',
    ],
    ['a removed entry', 'delete from audit_entries where organisation_id = ? and sequence = 2', 2, 'missing'],
    [
      'removed last entries',
      'delete from audit_entries where organisation_id = ? and sequence > 2',
      3,
      'missing',
    ],
    [
      'a changed time',
      'update audit_entries set at = at - interval 1 day where organisation_id = ? and sequence = 1',
      1,
      'content',
    ],
    [
      'another author',
      'update audit_entries set actor_id = null where organisation_id = ? and sequence = 3',
      3,
      'content',
    ],
  ])('finds %s', async (_what, sql, sequence, why) => {
    for (let n = 0; n < 3; n += 1) await write({ n })
    await tamper(sql, [own.organisationId])
    const { broken } = await verdict()
    expect(broken).toMatchObject({ sequence })
    expect(broken?.why).toContain(why)
  })

  it('shows an organisation only its own entries', async () => {
    await write()
    const other = await anOrganisation()
    expect(await audit.list(reading(other.manager), { limit: 10 })).toEqual([])
    expect(await audit.list(reading(own.manager), { limit: 10 })).toHaveLength(1)
  })
})
