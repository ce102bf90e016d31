/** How each guarded action's use-case is called, on the things of a world. One line an action of the matrix. */
import { type Actor } from '@/lib/access/actor'
import { calendarDay, type CalendarDay } from '@/lib/calendar/calendar-day'
import { newId } from '@/lib/platform/new-id'
import { addDefect } from '@/lib/use-cases/homes/add-defect'
import { addHome, AddHome } from '@/lib/use-cases/homes/add-home'
import { changeHome, ChangeHome } from '@/lib/use-cases/homes/change-home'
import { closeDefect } from '@/lib/use-cases/homes/close-defect'
import { recordFact } from '@/lib/use-cases/homes/record-fact'
import { recordInspection } from '@/lib/use-cases/homes/record-inspection'
import { cancelImport } from '@/lib/use-cases/imports/cancel-import'
import { changeLayout } from '@/lib/use-cases/imports/change-layout'
import { confirmImport } from '@/lib/use-cases/imports/confirm-import'
import { startCheck } from '@/lib/use-cases/imports/start-check'
import { addPatch } from '@/lib/use-cases/organisations/add-patch'
import { changeSettings } from '@/lib/use-cases/organisations/change-settings'
import { renamePatch } from '@/lib/use-cases/organisations/rename-patch'
import { changeAccess } from '@/lib/use-cases/people/change-access'
import { endAccess } from '@/lib/use-cases/people/end-access'
import { invitePerson } from '@/lib/use-cases/people/invite-person'
import { resendInvitation } from '@/lib/use-cases/people/resend-invitation'
import { withdrawInvitation } from '@/lib/use-cases/people/withdraw-invitation'
import { type World } from './a-world'

export const TODAY: CalendarDay = calendarDay('2026-12-01')

const LAST_YEAR = { day: calendarDay('2025-06-01'), precision: 'day' } as const
const identity = {
  kind: 'dwelling',
  address: '1 Lantern Row',
  postcode: 'ZX1 1AA',
  nation: 'england',
  tenure: 'social-rent',
}

type Call = (actor: Actor, world: World, today: CalendarDay) => Promise<unknown>

export const ACTION_CALLS: Readonly<Record<string, Call>> = {
  'app/(office)/people/actions.ts#invite': (actor) =>
    invitePerson(actor, { email: `${newId()}@lets.example`, role: 'auditor', patchIds: [] }),
  'app/(office)/people/actions.ts#resend': (actor, { invitationId }) =>
    resendInvitation(actor, { invitationId }),
  'app/(office)/people/actions.ts#withdraw': (actor, { invitationId }) =>
    withdrawInvitation(actor, { invitationId }),
  'app/(office)/people/[personId]/actions.ts#change': (actor, { personId }) =>
    changeAccess(actor, { personId, role: 'auditor', patchIds: [] }),
  'app/(office)/people/[personId]/actions.ts#end': (actor, { personId }) => endAccess(actor, { personId }),
  'app/(office)/settings/actions.ts#change': (actor) =>
    changeSettings(actor, { name: actor.organisationName, nation: 'england', noticeDays: 90 }),
  'app/(office)/settings/actions.ts#add': (actor) => addPatch(actor, { name: newId() }),
  'app/(office)/settings/actions.ts#rename': (actor, { patchId }) =>
    renamePatch(actor, { patchId, name: newId() }),
  'app/(office)/homes/new/actions.ts#add': (actor, _, today) =>
    addHome(actor, AddHome.parse({ ...identity, address: `${newId()} Lantern Row` }), today),
  'app/(office)/homes/[homeId]/actions.ts#correctFacts': (actor, { homeId }, today) =>
    recordFact(
      actor,
      { homeId, facts: [{ kind: 'board-type', value: 'breakers', note: null }], seen: {} },
      today,
    ),
  'app/(office)/homes/[homeId]/actions.ts#record': (actor, { homeId }, today) =>
    recordInspection(
      actor,
      {
        ...{ homeId, assessment: null, note: null, C1: 0, C2: 0, C3: 0, FI: 0 },
        inspectedOn: LAST_YEAR,
      },
      today,
    ),
  'app/(office)/homes/[homeId]/actions.ts#add': (actor, { homeId }, today) =>
    addDefect(actor, { homeId, code: 'C2', description: 'Cracked socket', location: null }, today),
  'app/(office)/homes/[homeId]/actions.ts#close': (actor, { homeId, defectId }, today) =>
    closeDefect(actor, { homeId, defectId, closedOn: today, note: 'Bonded and tested.' }, today),
  'app/(office)/homes/[homeId]/actions.ts#change': (actor, { homeId, patchId }, today) =>
    changeHome(actor, ChangeHome.parse({ ...identity, homeId, patch: patchId }), today),
  'app/(office)/imports/actions.ts#chooseSheet': (actor, { importId }, today) =>
    changeLayout(actor, { importId, sheet: 0, headerRow: 1 }, today),
  'app/(office)/imports/actions.ts#check': (actor, { importId }) =>
    startCheck(actor, { importId, columns: [] }),
  'app/(office)/imports/actions.ts#confirm': (actor, { importId }) => confirmImport(actor, { importId }),
  'app/(office)/imports/actions.ts#cancel': (actor, { importId }) => cancelImport(actor, { importId }),
}
