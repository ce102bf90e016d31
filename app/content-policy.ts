/** The content security policy of every page: scripts and styles by nonce, nothing from elsewhere but map tiles. */

/** The origin of a tile server's address, `{s}` standing for any subdomain; null where there is none or it is no address. */
export function tileOrigin(tileUrl: string | undefined): string | null {
  const match = /^(https?:\/\/)(\{s\}\.)?([^/?#{}]+)/.exec(tileUrl ?? '')
  return match ? `${match[1]}${match[2] ? '*.' : ''}${match[3]}` : null
}

/**
 * The policy for one response.
 * @param options.development the dev server evaluates code and injects styles; a build does neither
 */
export function contentPolicy(options: { nonce: string; tileUrl?: string; development: boolean }): string {
  const { nonce, tileUrl, development } = options
  const tiles = tileOrigin(tileUrl)
  return [
    `default-src 'self'`,
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${development ? ` 'unsafe-eval'` : ''}`,
    development ? `style-src 'self' 'unsafe-inline'` : `style-src 'self' 'nonce-${nonce}'`,
    `style-src-attr 'unsafe-inline'`,
    `img-src 'self' blob: data:${tiles ? ` ${tiles}` : ''}`,
    `font-src 'self'`,
    `connect-src 'self'`,
    `base-uri 'self'`,
    `form-action 'self'`,
    `object-src 'none'`,
    `frame-ancestors 'none'`,
  ].join('; ')
}
