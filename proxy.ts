/**
 * Gives every page its nonce and content security policy, and tells the page its own address. It is no guard: each
 * page, action and handler asks for the actor itself.
 */
import { randomBytes } from 'node:crypto'
import { type NextRequest, NextResponse } from 'next/server'
import { contentPolicy } from '@/app/content-policy'
import { env } from '@/lib/platform/env'

const development = process.env.NODE_ENV === 'development' // settled when it is built, so no setting

export function proxy(request: NextRequest): NextResponse {
  const nonce = randomBytes(16).toString('base64')
  const policy = contentPolicy({ nonce, tileUrl: env().TILE_URL, development })
  const headers = new Headers(request.headers)
  headers.set('x-nonce', nonce)
  headers.set('x-here', request.nextUrl.pathname + request.nextUrl.search)
  headers.set('Content-Security-Policy', policy) // the framework takes the nonce for its own tags from here
  const response = NextResponse.next({ request: { headers } })
  response.headers.set('Content-Security-Policy', policy)
  return response
}

/** Pages only: not the API (whose uploads would be cut to 10 MB), not the built files, not files with an ending. */
export const config = { matcher: ['/((?!api/|_next/static|_next/image|.*\\.[a-z0-9]+$).*)'] }
