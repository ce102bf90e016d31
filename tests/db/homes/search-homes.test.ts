import { beforeAll, describe, expect, it } from 'vitest'
import { inTransaction } from '@/db/connection'
import * as homes from '@/db/repositories/homes'
import { type HomeQuery, homeQueryOf } from '@/lib/homes/home-query'
import { newId } from '@/lib/platform/new-id'
import { findHomes } from '@/lib/use-cases/homes/find-homes'
import { listHomes } from '@/lib/use-cases/homes/list-homes'
import { refreshHomes } from '@/lib/use-cases/homes/refresh-homes'
import { anOrganisation, type AnOrganisation } from '@/tests/builders/an-organisation'
import { countingStatements } from './counting-statements'
import { TODAY } from './some-homes'

let organisation: AnOrganisation

const home = (given: Partial<homes.Home>): homes.Home => ({
  id: newId(),
  kind: 'dwelling',
  reference: null,
  uprn: null,
  address: '1 Nowhere',
  town: 'Quillhaven',
  postcode: null,
  addressKey: newId(),
  nation: 'england',
  tenure: 'social-rent',
  patchId: organisation.patches.north,
  blockId: null,
  latitude: null,
  longitude: null,
  note: null,
  ...given,
})

beforeAll(async () => {
  organisation = await anOrganisation()
  const made = [
    home({ address: '12 Herring Row', postcode: 'ZX1 2AB', uprn: '990012345678', reference: 'QH-0012' }),
    home({ address: '112 Herring Row', postcode: 'ZX1 2AB', uprn: '990012345679', reference: 'QH-0112' }),
    home({
      address: 'Flat 3, 9 St Mary’s Gardens',
      postcode: 'ZX12 3CD',
      uprn: '12345678',
      reference: 'MB/7 a',
    }),
    home({ address: '4 Ffordd y Môr', town: 'Marram Bay', postcode: 'YX4 5EF', reference: '100%' }),
    home({ address: '5 Under_score Way', postcode: null, reference: 'A_1' }),
    home({ address: '12 Copper Lane', postcode: 'WX9 9ZZ', patchId: organisation.patches.south }),
  ]
  await inTransaction(organisation, async (scope) => {
    await homes.insertMany(scope, made)
    await refreshHomes(
      scope,
      made.map((one) => one.id),
      TODAY,
    )
  })
})

const addresses = async (search: string, given: Partial<HomeQuery> = {}) =>
  (await listHomes(organisation.manager, { ...homeQueryOf({}), ...given, search }, TODAY)).rows
    .map((row) => row.address)
    .toSorted()

describe('search', () => {
  it.each([
    ['12 herring', ['12 Herring Row']],
    ['HERRING row', ['112 Herring Row', '12 Herring Row']],
    ['row herring', ['112 Herring Row', '12 Herring Row']],
    ['zx1 2ab', ['112 Herring Row', '12 Herring Row']],
    ['ZX12AB', ['112 Herring Row', '12 Herring Row']],
    ['12 herring row zx12ab', ['12 Herring Row']],
    ['12 herring row, ZX1  2AB', ['12 Herring Row']],
    ['990012345678', ['12 Herring Row']],
    ['9900 1234 5678', ['12 Herring Row']],
    ['000012345678', ['Flat 3, 9 St Mary’s Gardens']],
    ['qh0012', ['12 Herring Row']],
    ['QH 0012', ['12 Herring Row']],
    ['qh-0012', ['12 Herring Row']],
    ['mb7a', ['Flat 3, 9 St Mary’s Gardens']],
    ["st mary's", ['Flat 3, 9 St Mary’s Gardens']],
    ['St. Marys', ['Flat 3, 9 St Mary’s Gardens']],
    ['mor', ['4 Ffordd y Môr']],
    ['marram', ['4 Ffordd y Môr']],
    ['ffordd herring', []],
    ['12', ['12 Copper Lane', '12 Herring Row', 'Flat 3, 9 St Mary’s Gardens']],
    [
      '',
      [
        '112 Herring Row',
        '12 Copper Lane',
        '12 Herring Row',
        '4 Ffordd y Môr',
        '5 Under_score Way',
        'Flat 3, 9 St Mary’s Gardens',
      ],
    ],
  ])('for “%s” finds %j', async (search, found) => {
    expect(await addresses(search)).toEqual(found)
  })

  it.each(['%', '_', '%%', '\\', "'", '";--', '•'])('for %s, a mark alone, finds nothing', async (search) => {
    expect(await addresses(search)).toEqual([])
  })

  it.each([
    ['herr%row', ['112 Herring Row', '12 Herring Row']],
    ['row_herr', ['112 Herring Row', '12 Herring Row']],
    ['herr%lane', []],
    ['100%', ['4 Ffordd y Môr']],
    ['a_1', ['5 Under_score Way', 'Flat 3, 9 St Mary’s Gardens']],
  ])('takes the signs of a pattern for gaps between words: %s', async (search, found) => {
    expect(await addresses(search)).toEqual(found)
  })
})

describe('the search box', () => {
  it('puts whole words first, then goes by address', async () => {
    const { homes: found } = await findHomes(organisation.manager, { q: '12' }, TODAY)
    expect(found.map((one) => one.address)).toEqual([
      '12 Copper Lane',
      '12 Herring Row',
      'Flat 3, 9 St Mary’s Gardens',
    ])
  })

  it('finds nothing for nothing, and asks the database nothing', async () => {
    const { result, statements } = await countingStatements(() =>
      findHomes(organisation.manager, { q: ' - ' }, TODAY),
    )
    expect(result).toEqual({ homes: [] })
    expect(statements).toEqual([])
  })

  it('holds eight at most, in two statements', async () => {
    const made = Array.from({ length: 12 }, (_, at) => home({ address: `${at + 1} Plenty Place` }))
    await inTransaction(organisation, async (scope) => {
      await homes.insertMany(scope, made)
      await refreshHomes(
        scope,
        made.map((one) => one.id),
        TODAY,
      )
    })
    const { result, statements } = await countingStatements(() =>
      findHomes(organisation.manager, { q: 'plenty' }, TODAY),
    )
    expect(result.homes.map((one) => Number.parseInt(one.address))).toEqual([1, 2, 3, 4, 5, 6, 7, 8])
    expect(statements.length).toBe(2)
  })
})
