import { type Knex } from 'knex'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { inTransaction, reading } from '@/db/connection'
import { openPool } from '@/db/knex'
import { asksForAnotherTry, retrying } from '@/db/retrying'
import { env } from '@/lib/platform/env'
import { anOrganisation, type AnOrganisation } from '@/tests/builders/an-organisation'

let ours: AnOrganisation
let other: Knex

beforeAll(async () => {
  ours = await anOrganisation()
  other = openPool(env().DATABASE_URL, 2)
})
afterAll(() => other.destroy())

const patch = (db: Knex, id: string) => db('patches').where({ organisation_id: ours.organisationId, id })
const rename = (db: Knex, id: string, name: string) => patch(db, id).update({ name })
const nameOf = async (id: string) => (await patch(reading(ours.manager).db, id).first('name'))?.name as string

beforeEach(async () => {
  await rename(other, ours.patches.north, 'North')
  await rename(other, ours.patches.south, 'South')
})

/** Two parties that each wait until the other has come. */
function meeting() {
  let here = 0
  let open = () => {}
  const both = new Promise<void>((resolve) => (open = resolve))
  return () => {
    here += 1
    if (here >= 2) open()
    return both
  }
}

describe('a deadlock between two transactions', () => {
  it('is tried again, and both changes stand', async () => {
    const meet = meeting()
    const attempts = { first: 0, second: 0 }
    const crossing = (who: 'first' | 'second', one: string, two: string) =>
      inTransaction(ours.manager, async ({ db }) => {
        attempts[who] += 1
        await rename(db, one, `${who} one`)
        await meet() // each now holds what the other wants
        await rename(db, two, `${who} two`)
        return who
      })

    const done = await Promise.all([
      crossing('first', ours.patches.north, ours.patches.south),
      crossing('second', ours.patches.south, ours.patches.north),
    ])

    expect(done).toEqual(['first', 'second'])
    expect(attempts.first + attempts.second).toBeGreaterThan(2)
    // whichever came last wrote both, so the two names are of one transaction
    const names = [await nameOf(ours.patches.north), await nameOf(ours.patches.south)]
    expect([
      ['first one', 'first two'],
      ['second two', 'second one'],
    ]).toContainEqual(names)
  })
})

describe('a row that changed after it was read', () => {
  it('is read again under snapshot isolation, so that no change is lost', async () => {
    let attempts = 0
    await inTransaction(ours.manager, async ({ db }) => {
      attempts += 1
      const seen = (await patch(db, ours.patches.north).first('name'))?.name as string
      if (attempts === 1) await rename(other, ours.patches.north, 'North East')
      await rename(db, ours.patches.north, `${seen}, renamed`)
    })
    expect(attempts).toBe(2)
    expect(await nameOf(ours.patches.north)).toBe('North East, renamed')
  })
})

describe('what is not tried again', () => {
  it('is a fault of the statement, which is thrown as it is and leaves nothing behind', async () => {
    let attempts = 0
    const attempt = inTransaction(ours.manager, async ({ db }) => {
      attempts += 1
      await rename(db, ours.patches.north, 'Half done')
      await rename(db, ours.patches.south, 'Half done') // one name, twice: the unique key refuses
    })
    await expect(attempt).rejects.toMatchObject({ errno: 1062 })
    expect(attempts).toBe(1)
    expect(await nameOf(ours.patches.north)).toBe('North')
  })

  it('is a database that keeps asking: after five tries the fault comes out', async () => {
    let attempts = 0
    const deadlock = Object.assign(new Error('deadlock'), { errno: 1213 })
    const attempt = retrying(() => {
      attempts += 1
      return Promise.reject(deadlock)
    })
    await expect(attempt).rejects.toBe(deadlock)
    expect(attempts).toBe(5)
  })

  it.each([
    [{ errno: 1020 }, true],
    [{ errno: 1205 }, true],
    [{ errno: 1213 }, true],
    [{ errno: 1062 }, false],
    [new Error('fault'), false],
    [null, false],
  ])('%o asks for another try: %s', (thrown, answer) => {
    expect(asksForAnotherTry(thrown)).toBe(answer)
  })
})
