import { type DeploymentScope } from '@/db/connection'
import * as passwordResets from '@/db/repositories/password-resets'
import { now } from '@/lib/platform/clock'
import { newToken, tokenHash } from '@/lib/platform/secret-token'

/** How long a link to choose a new password lives [h]. Judgement. */
export const RESET_HOURS = 1
/** How long a link to choose the first password lives [h]. Judgement: nothing is behind it yet. */
export const FIRST_PASSWORD_HOURS = 24

/** Stores a fresh reset of a person and gives the token for the link. */
export async function beginReset(
  scope: Pick<DeploymentScope, 'db'>,
  personId: string,
  hours: number,
): Promise<string> {
  const token = newToken()
  const at = now()
  const expiresAt = new Date(at.getTime() + hours * 3_600_000)
  await passwordResets.insert(scope, { personId, tokenHash: tokenHash(token), at, expiresAt })
  return token
}
