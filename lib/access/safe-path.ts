/**
 * A path of this site to go on to after signing in, or null: never another site, nor the API.
 * @example safePath('/homes?board=rewireable') // '/homes?board=rewireable'
 * @example safePath('//elsewhere.example') // null
 */
export function safePath(given: string | null | undefined): string | null {
  if (
    !given ||
    !/^\/(?![/\\])[^\\\p{Cc}]*$/u.test(given) ||
    given.startsWith('/api/') ||
    given.startsWith('/sign-')
  )
    return null
  const base = 'https://here.invalid'
  if (!URL.canParse(given, base)) return null
  const url = new URL(given, base)
  return url.origin === base ? url.pathname + url.search : null
}
