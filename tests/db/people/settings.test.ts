import { beforeEach, describe, expect, it } from 'vitest'
import { type AnOrganisation, anOrganisation } from '@/tests/builders/an-organisation'
import { reading } from '@/db/connection'
import * as audit from '@/db/repositories/audit'
import { NotAllowed, NotFound } from '@/lib/errors/expected'
import { addPatch } from '@/lib/use-cases/organisations/add-patch'
import { changeSettings, ChangeSettings } from '@/lib/use-cases/organisations/change-settings'
import { readSettings } from '@/lib/use-cases/organisations/read-settings'
import { renamePatch } from '@/lib/use-cases/organisations/rename-patch'

let homes: AnOrganisation
beforeEach(async () => void (homes = await anOrganisation()))

const change = { name: ' Harrowgate  & Vale ', nation: 'scotland', noticeDays: '60' }

describe('the settings of an organisation', () => {
  it('are changed by a manager, on record and without its names', async () => {
    await changeSettings(homes.manager, ChangeSettings.parse(change))
    expect((await readSettings(homes.auditor)).organisation).toMatchObject({
      name: 'Harrowgate  & Vale',
      nation: 'scotland',
      noticeDays: 60,
    })
    const [entry] = await audit.list(reading(homes.manager), { limit: 1 })
    expect(entry).toMatchObject({
      did: 'organisation.settings-changed',
      detail: { nation: ['england', 'scotland'], noticeDays: [90, 60], nameChanged: true },
    })
  })

  it.each(['1', '365', ' 90 '])('take %j days of notice', (noticeDays) =>
    expect(ChangeSettings.safeParse({ ...change, noticeDays }).success).toBe(true),
  )

  it.each(['0', '366', '-1', '1.5', '', 'ninety', '1e2', undefined])(
    'refuse %j days of notice',
    (noticeDays) => {
      const { error } = ChangeSettings.safeParse({ ...change, noticeDays })
      expect(error?.issues.map((issue) => [issue.path[0], issue.message])).toEqual([
        ['noticeDays', 'Enter a whole number of days from 1 to 365.'],
      ])
    },
  )

  it('are an auditor’s to read, and nobody else’s but a manager’s to change', async () => {
    for (const actor of [homes.officer, homes.auditor, homes.supervisor, homes.electrician])
      await expect(changeSettings(actor, ChangeSettings.parse(change))).rejects.toBeInstanceOf(NotAllowed)
    for (const actor of [homes.officer, homes.supervisor, homes.electrician])
      await expect(readSettings(actor)).rejects.toBeInstanceOf(NotAllowed)
  })
})

describe('the patches of an organisation', () => {
  const names = async (actor = homes.manager) =>
    (await readSettings(actor)).patches.map((patch) => patch.name)

  it('are added and renamed', async () => {
    await addPatch(homes.manager, { name: 'East' })
    await renamePatch(homes.manager, { patchId: homes.patches.south, name: 'Southern' })
    expect(await names()).toEqual(['East', 'North', 'Southern'])
    const trail = await audit.list(reading(homes.manager), { limit: 2 })
    expect(trail.map((entry) => entry.did)).toEqual(['patch.renamed', 'patch.added'])
  })

  it('have one name each, in any case', async () => {
    const taken = { problems: [{ field: 'name', problem: 'There is a patch of that name already.' }] }
    await expect(addPatch(homes.manager, { name: 'NORTH' })).rejects.toMatchObject(taken)
    await expect(
      renamePatch(homes.manager, { patchId: homes.patches.south, name: 'north' }),
    ).rejects.toMatchObject(taken)
    await renamePatch(homes.manager, { patchId: homes.patches.north, name: 'NORTH' })
    expect(await names()).toEqual(['NORTH', 'South'])
  })

  it('of another organisation are not found', async () => {
    const other = await anOrganisation()
    await expect(
      renamePatch(other.manager, { patchId: homes.patches.north, name: 'Mine' }),
    ).rejects.toBeInstanceOf(NotFound)
    expect(await names()).toEqual(['North', 'South'])
    await addPatch(other.manager, { name: 'East' })
    expect(await names()).toEqual(['North', 'South'])
  })
})
