import NextAuth from 'next-auth'
import { authOptions } from '@/app/auth-options'

type Handler = (request: Request, context: { params: Promise<{ nextauth: string[] }> }) => Promise<Response>

/** The library's own sign-in, sign-out and session endpoints, over the same use-cases as the pages. */
const handler: Handler = (request, context) => {
  const handle = NextAuth(authOptions()) as Handler
  return handle(request, context)
}

export { handler as GET, handler as POST }
