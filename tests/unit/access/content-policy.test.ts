import { describe, expect, it } from 'vitest'
import { contentPolicy, tileOrigin } from '@/app/content-policy'

const policy = (given: Partial<Parameters<typeof contentPolicy>[0]> = {}) =>
  new Map(
    contentPolicy({ nonce: 'n0nce', development: false, ...given })
      .split('; ')
      .map((directive) => [directive.split(' ')[0], directive.split(' ').slice(1)] as const),
  )

// Directives and keywords as in W3C Content Security Policy Level 3.
describe('the content security policy', () => {
  it('lets scripts run by the nonce alone', () => {
    expect(policy().get('script-src')).toEqual(["'self'", "'nonce-n0nce'", "'strict-dynamic'"])
    expect(policy().get('style-src')).toEqual(["'self'", "'nonce-n0nce'"])
    expect(policy().get('style-src-attr')).toEqual(["'unsafe-inline'"])
  })

  it('lets no other page frame it, and no plugin or form of another site in', () => {
    expect(policy().get('frame-ancestors')).toEqual(["'none'"])
    expect(policy().get('object-src')).toEqual(["'none'"])
    expect(policy().get('form-action')).toEqual(["'self'"])
    expect(policy().get('base-uri')).toEqual(["'self'"])
  })

  it('takes pictures from the tile server where one is set, and from nowhere else', () => {
    expect(policy().get('img-src')).toEqual(["'self'", 'blob:', 'data:'])
    const withTiles = policy({ tileUrl: 'https://{s}.tiles.example:8443/{z}/{x}/{y}.png' })
    expect(withTiles.get('img-src')).toEqual(["'self'", 'blob:', 'data:', 'https://*.tiles.example:8443'])
    expect(withTiles.get('connect-src')).toEqual(["'self'"])
  })

  it('evaluates code in development alone', () => {
    expect(contentPolicy({ nonce: 'n', development: true })).toContain("'unsafe-eval'")
    expect(contentPolicy({ nonce: 'n', development: false })).not.toContain("'unsafe-eval'")
  })
})

describe('the origin of a tile server', () => {
  it.each([
    ['https://tiles.example/{z}/{x}/{y}.png', 'https://tiles.example'],
    ['http://127.0.0.1:8080/{z}/{x}/{y}.png?key=1', 'http://127.0.0.1:8080'],
    ['https://{s}.tiles.example/{z}', 'https://*.tiles.example'],
    ['tiles.example/{z}', null],
    ['', null],
    [undefined, null],
  ])('%s is %s', (url, origin) => expect(tileOrigin(url)).toBe(origin))
})
