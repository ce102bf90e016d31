import fc from 'fast-check'
import { expect, it } from 'vitest'
import { slugOf } from '@/lib/organisations/slug-of'

it.each([
  ['Pat & Jo’s Lettings', 'pat-jos-lettings'],
  ['Tŷ Môn Housing', 'ty-mon-housing'],
  ['   ', 'organisation'],
  ['漢字', 'organisation'],
  ['A'.repeat(80), 'a'.repeat(48)],
])('%s is %s', (name, slug) => expect(slugOf(name)).toBe(slug))

it('is always a word for a command', () => {
  fc.assert(
    fc.property(fc.string(), (name) => {
      expect(slugOf(name)).toMatch(/^[a-z0-9]+(-[a-z0-9]+)*$/)
    }),
  )
})
