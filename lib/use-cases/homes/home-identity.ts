/** Who and where a home is, as a form gives it: shared by adding a home and changing one. */
import { z } from 'zod'
import { type WritingScope } from '@/db/connection'
import * as blocks from '@/db/repositories/blocks'
import * as homes from '@/db/repositories/homes'
import * as patches from '@/db/repositories/patches'
import { type Actor } from '@/lib/access/actor'
import { reaches } from '@/lib/access/can'
import { type FieldProblem, Invalid, NotFound } from '@/lib/errors/expected'
import { oneLine } from '@/lib/forms/one-line'
import { NATIONS } from '@/lib/homes/nation'
import { TENURES } from '@/lib/homes/tenure'
import { addressKey } from '@/lib/imports/address-key'
import { readPostcode } from '@/lib/imports/read-postcode'
import { type Reading } from '@/lib/imports/reading'
import { readUprn } from '@/lib/imports/read-uprn'
import { optionalLine, optionalLines } from './text-fields'

const readBy = (read: (text: string) => Reading<string | null>, problem: string) =>
  z
    .preprocess((given) => given ?? '', z.string())
    .transform((text, context): string | null => {
      const reading = read(text)
      if (reading.ok) return reading.value
      context.addIssue({ code: 'custom', message: problem })
      return z.NEVER
    })

const empty = (given: unknown) => (given === '' || given === undefined ? null : given)
const degrees = (least: number, most: number, what: string) =>
  z.preprocess(
    empty,
    z.coerce
      .number(`Write the ${what} in degrees, such as ${((least + most) / 2).toFixed(3)}.`)
      .min(least, `That ${what} lies outside the United Kingdom's waters.`)
      .max(most, `That ${what} lies outside the United Kingdom's waters.`)
      .nullable(),
  )

/** The fields of a form about a home. A patch is chosen by id; a block is typed, and made where it is new. */
export const IDENTITY_FIELDS = {
  kind: z.enum(['dwelling', 'communal']).default('dwelling'),
  address: oneLine('Write the first lines of the address, such as 12 Herring Row.', 200),
  town: optionalLine(120),
  postcode: readBy(
    readPostcode,
    'That is not a postcode. One looks like ZX1 2AB; take care with the letter O and the figure 0.',
  ),
  reference: optionalLine(60),
  uprn: readBy(
    readUprn,
    'That is not a UPRN: it is a number of up to 12 figures. Leave it empty if you do not have it.',
  ),
  nation: z.enum(NATIONS, 'Choose the nation that the home is in: its law sets the inspection.'),
  tenure: z.enum(TENURES, 'Choose how the home is held; “Not known” is an answer.').default('unknown'),
  patch: z.preprocess(
    (given) => (given === 'none' ? null : empty(given)),
    z.uuid('Choose a patch from the list.').nullable(),
  ),
  block: optionalLine(160),
  latitude: degrees(49, 62, 'latitude'),
  longitude: degrees(-12, 4, 'longitude'),
  note: optionalLines(500),
} as const

export type Identity = z.output<z.ZodObject<typeof IDENTITY_FIELDS>>

/** Half a position is none. */
export function positionProblems({ latitude, longitude }: Identity): FieldProblem[] {
  if ((latitude === null) === (longitude === null)) return []
  const missing = latitude === null ? 'latitude' : 'longitude'
  return [{ field: missing, problem: `Give the ${missing} too, or leave both empty.` }]
}

async function patchIdOf(scope: WritingScope, actor: Actor, patch: string | null): Promise<string | null> {
  if (patch === null) {
    if (!reaches(actor, { patchId: null }))
      throw new Invalid([
        {
          field: 'patch',
          problem: 'Choose one of your patches: a home without a patch would be out of your sight.',
        },
      ])
    return null
  }
  if (!reaches(actor, { patchId: patch })) throw new NotFound('That patch')
  return (await patches.getById(scope, patch)).id
}

async function blockIdOf(scope: WritingScope, name: string | null): Promise<string | null> {
  if (name === null) return null
  return ((await blocks.findByName(scope, name)) ?? (await blocks.insert(scope, name))).id
}

/** What another home of the organisation uses already. It is not named: it may lie in a patch that is not the person's. */
async function refuseTaken(scope: WritingScope, home: homes.Home): Promise<void> {
  const others = (await homes.listAlike(scope, home)).filter((other) => other.id !== home.id)
  const problems: FieldProblem[] = []
  if (home.uprn !== null && others.some((other) => other.uprn === home.uprn))
    problems.push({ field: 'uprn', problem: 'Another home in the register has this UPRN already.' })
  const reference = home.reference?.toLowerCase()
  if (reference !== undefined && others.some((other) => other.reference?.toLowerCase() === reference))
    problems.push({ field: 'reference', problem: 'Another home in the register has this reference already.' })
  if (others.some((other) => other.addressKey === home.addressKey))
    problems.push({
      field: 'address',
      problem: 'A home with this address and postcode is in the register already.',
    })
  if (problems.length > 0) throw new Invalid(problems)
}

/**
 * The home that an identity makes, checked against the others of the organisation.
 * @throws Invalid where a UPRN, reference or address is taken; NotFound where the patch is not within reach
 */
export async function homeOf(
  scope: WritingScope,
  actor: Actor,
  id: string,
  identity: Identity,
): Promise<homes.Home> {
  const { patch, block, ...rest } = identity
  const home = {
    ...rest,
    id,
    addressKey: addressKey(rest),
    patchId: await patchIdOf(scope, actor, patch),
    blockId: await blockIdOf(scope, block),
  }
  await refuseTaken(scope, home)
  return home
}
