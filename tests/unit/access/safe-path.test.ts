import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { safePath } from '@/lib/access/safe-path'

describe('where somebody goes on to after signing in', () => {
  it.each(['/today', '/homes?board=rewireable&sort=risk', '/homes/0190', '/'])('may be %s', (path) =>
    expect(safePath(path)).toBe(path),
  )

  it.each([
    ...[
      '',
      'today',
      'https://elsewhere.example',
      '//elsewhere.example',
      '/\\elsewhere.example',
      '\\/elsewhere.example',
    ],
    ...[
      '/\t/elsewhere.example',
      '/api/v1/homes',
      '/sign-in',
      '/sign-in?next=/sign-in',
      'javascript:alert(1)',
      '/\nfoo',
    ],
  ])('may not be %j', (path) => expect(safePath(path)).toBeNull())

  it('never leads to another site, whatever is given', () => {
    fc.assert(
      fc.property(
        fc.oneof(
          fc.string(),
          fc.webUrl(),
          fc.string().map((text) => `/${text}`),
        ),
        (given) => {
          const path = safePath(given)
          if (path !== null)
            expect(new URL(path, 'https://fuseward.example').origin).toBe('https://fuseward.example')
        },
      ),
    )
  })
})
