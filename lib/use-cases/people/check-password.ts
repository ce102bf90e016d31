import { deployment } from '@/db/connection'
import * as people from '@/db/repositories/people'
import { Invalid } from '@/lib/errors/expected'
import { passwordMatches } from '@/lib/gateways/password'
import { countTry } from './sign-in-limits'
import { type Visitor } from './visitor'

/**
 * The person to whom an address and a password belong. An address that is not known and a password that is wrong get
 * the same answer after the same work.
 * @throws Invalid where they do not belong together, Conflict where there were too many tries
 */
export async function checkPassword(
  visitor: Visitor,
  { email, password }: { email: string; password: string },
): Promise<people.Person> {
  const takeBack = await countTry(visitor, email)
  const person = await people.findByEmail(deployment(), email)
  const matches = await passwordMatches(person?.passwordHash ?? null, password)
  if (!person || !matches)
    throw new Invalid([
      { field: 'email', problem: 'That e-mail address and that password do not belong together.' },
    ])
  await takeBack()
  return person
}
