import 'server-only'
import { type NextAuthOptions } from 'next-auth'
import CredentialsProvider from 'next-auth/providers/credentials'
import { SignIn } from '@/lib/access/sign-in-fields'
import { isRefusal } from '@/lib/errors/expected'
import { env } from '@/lib/platform/env'
import { logFault } from '@/lib/platform/log-fault'
import { endSession } from '@/lib/use-cases/people/end-session'
import { SESSION_DAYS } from '@/lib/use-cases/people/session-life'
import { signIn } from '@/lib/use-cases/people/sign-in'
import { rememberDevice, visitor } from './visitor'

declare module 'next-auth' {
  interface User {
    /** the session row that signing in began */
    session?: string
  }
}

/** Checks the password by the same use-case as the sign-in page, and begins a session row. */
async function authorize(credentials: Record<string, string> | undefined) {
  const parsed = SignIn.safeParse(credentials)
  if (!parsed.success) return null
  try {
    const letIn = await signIn(await visitor(), parsed.data)
    await rememberDevice(letIn.device)
    return { id: letIn.personId, session: letIn.sessionId }
  } catch (thrown) {
    if (!isRefusal(thrown)) logFault(thrown, 'auth')
    return null
  }
}

/** How next-auth is set up: a token that names a session row and holds nothing else. */
export const authOptions = (): NextAuthOptions => ({
  secret: env().NEXTAUTH_SECRET,
  session: { strategy: 'jwt', maxAge: SESSION_DAYS * 24 * 60 * 60 },
  pages: { signIn: '/sign-in', error: '/sign-in' },
  providers: [
    CredentialsProvider({
      credentials: {
        email: { label: 'E-mail address', type: 'email' },
        password: { label: 'Password', type: 'password' },
      },
      authorize,
    }),
  ],
  callbacks: {
    jwt: ({ token, user }) => ({ session: user ? user.session : token.session }),
    // what the library would tell a script: that there is a cookie, and nothing about whose
    session: ({ session }) => ({ expires: session.expires }),
    redirect: ({ url, baseUrl }) => (new URL(url, baseUrl).origin === baseUrl ? url : baseUrl),
  },
  events: {
    signOut: async ({ token }) => {
      if (typeof token.session === 'string') await endSession(token.session)
    },
  },
  logger: {
    error: (code) => void logFault(new Error(`next-auth: ${code}`), 'auth'),
    warn: () => {},
    debug: () => {},
  },
})
