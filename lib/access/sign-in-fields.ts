/** The fields of the forms about people, with the words of their problems. */
import { z } from 'zod'
import { oneLine } from '@/lib/forms/one-line'
import { PASSWORD_MAXIMUM } from './password-problem'

const ASK = 'Enter an e-mail address, like name@example.com.'

/** An e-mail address, in lower case: addresses that differ in case alone are one person's. */
export const emailAddress = z
  .string({ error: ASK })
  .transform((text) => text.trim().toLowerCase())
  .pipe(z.email(ASK).max(254, ASK))

export const personName = oneLine('Enter your name.', 120)

/** A password as it is typed to sign in; what a new one must be is password-problem.ts. */
export const typedPassword = z
  .string({ error: 'Enter your password.' })
  .min(1, 'Enter your password.')
  .max(PASSWORD_MAXIMUM, `Use ${PASSWORD_MAXIMUM} characters or fewer.`)

/** The secret part of a link that was sent by e-mail. */
export const linkToken = z
  .string()
  .regex(/^[\w-]{43}$/, 'This link is not whole. Open it again from the e-mail.')

export const SignIn = z.object({ email: emailAddress, password: typedPassword })
export type SignIn = z.infer<typeof SignIn>
