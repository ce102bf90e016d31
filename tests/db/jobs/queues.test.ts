/** Jobs and notices: claimed once, never lost, taken over from a worker that died. */
import { beforeEach, describe, expect, it } from 'vitest'
import { deployment, inTransaction, reading } from '@/db/connection'
import * as jobs from '@/db/repositories/jobs'
import * as outbox from '@/db/repositories/outbox'
import { type Job } from '@/lib/use-cases/jobs/job'
import { runNextJob } from '@/lib/use-cases/jobs/run-next-job'
import { type AnOrganisation, anOrganisation } from '@/tests/builders/an-organisation'

let own: AnOrganisation
const queue = (businessKey: string, kind = 'count') =>
  inTransaction(own.manager, (scope) =>
    jobs.enqueue(scope, { kind, businessKey, payload: { key: businessKey } }),
  )
const post = (businessKey: string) =>
  inTransaction(own.manager, (scope) =>
    outbox.enqueue(scope, { businessKey, to: 'a@harrowgate.example', subject: 's', text: 't', html: 'h' }),
  )
const empty = async (table: string) => reading(own.manager).db(table).delete()

beforeEach(async () => {
  own = await anOrganisation()
  await empty('jobs')
  await empty('outbox')
})

describe('the job queue', () => {
  it('runs each job once, however many workers ask', async () => {
    for (let n = 0; n < 20; n += 1) await queue(`k${n}`)
    const ran: string[] = []
    const count: Job = { kind: 'count', run: async ({ payload }) => void ran.push(String(payload.key)) }
    const worker = async (name: string) => {
      while (await runNextJob(name, new Map([['count', count]]))) continue
    }
    await Promise.all(['a', 'b', 'c'].map(worker))
    expect(ran.sort()).toEqual(Array.from({ length: 20 }, (_, n) => `k${n}`).sort())
  })

  it('queues one job a business key', async () => {
    await queue('same')
    await queue('same')
    expect(await jobs.claim(deployment(), 'a', 60)).not.toBeNull()
    expect(await jobs.claim(deployment(), 'b', 60)).toBeNull()
  })

  it('takes over from a worker that died, and the dead one can no longer finish', async () => {
    await queue('k')
    const dead = await jobs.claim(deployment(), 'dead', -1)
    const heir = await jobs.claim(deployment(), 'heir', 60)
    expect(heir?.id).toBe(dead?.id)
    expect(dead && (await jobs.markDone(deployment(), dead))).toBe(false)
    expect(heir && (await jobs.markDone(deployment(), heir))).toBe(true)
  })

  it('tries again later after a failure, and says when it gives up', async () => {
    await queue('k', 'fail')
    const given: string[] = []
    const fail: Job = {
      kind: 'fail',
      run: () => Promise.reject(new Error('no luck')),
      giveUp: async (_context, why) => void given.push(why),
    }
    const known = new Map([['fail', fail]])
    for (let attempt = 1; attempt <= 5; attempt += 1) {
      expect(await runNextJob('w', known)).toBe(true)
      expect(await runNextJob('w', known)).toBe(false)
      await reading(own.manager)
        .db('jobs')
        .update({ due_at: new Date(0) })
        .where({ state: 'waiting' })
    }
    expect(given).toHaveLength(1)
    expect(await jobs.findProgress(reading(own.manager), 'fail', 'k')).toMatchObject({
      state: 'dead',
      error: 'no luck',
    })
  })
})

describe('the outbox', () => {
  it('gives each notice to one sender', async () => {
    for (let n = 0; n < 12; n += 1) await post(`n${n}`)
    const claims = await Promise.all(
      Array.from({ length: 12 }, (_, n) => outbox.claim(deployment(), `s${n}`, 60)),
    )
    const ids = claims.flatMap((claim) => (claim ? [claim.id] : []))
    expect(new Set(ids).size).toBe(ids.length)
  })

  it('holds one notice a business key, and none of a change that was rolled back', async () => {
    await post('n')
    await post('n')
    const failing = inTransaction(own.manager, async (scope) => {
      await outbox.enqueue(scope, {
        businessKey: 'other',
        to: 'a@b.example',
        subject: 's',
        text: 't',
        html: 'h',
      })
      throw new Error('no')
    })
    await expect(failing).rejects.toThrow('no')
    expect(await reading(own.manager).db('outbox').where('organisation_id', own.organisationId)).toHaveLength(
      1,
    )
  })
})
