import 'server-only'
import { type Choice } from '@/components/ui/select-field'
import { type Actor } from '@/lib/access/actor'
import { can } from '@/lib/access/can'
import { today } from '@/lib/platform/clock'
import { filterChoices } from '@/lib/use-cases/homes/filter-choices'
import { readSettings } from '@/lib/use-cases/organisations/read-settings'

/** The patches that a person can file a home under; "in no patch" only for somebody who would still see it there. */
export async function patchChoices(actor: Actor): Promise<readonly Choice[]> {
  const seesAll = can(actor, 'organisation.read')
  const { patches } = seesAll ? await readSettings(actor) : await filterChoices(actor, today())
  const choices = patches.map(({ id, name }) => ({ value: id, label: name }))
  return actor.patches === 'all' && choices.length > 0
    ? [{ value: 'none', label: 'In no patch' }, ...choices]
    : choices
}
