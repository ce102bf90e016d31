/**
 * Who gets in where: a row for every page, route handler and action of app/. A test fails for an entry without a row
 * and for a row without an entry (tests/unit/access/matrix-is-complete.test.ts); the rows are walked over HTTP
 * (tests/e2e/access-matrix.spec.ts) and, for actions, by their use-cases (tests/db/access/actions.test.ts).
 *
 * To add a page: its file, and who gets in. A `[homeId]`, `[importId]`, `[personId]` or `[token]` of the path stands for
 * that thing in a-world.ts: it belongs to the first organisation, a home to its north patch.
 */
import { type Permission } from '@/lib/access/permission'
import {
  AUDITED,
  CONTRACTORS,
  EDITORS,
  ELSEWHERE,
  EVERYBODY,
  MANAGERS,
  OFFICE,
  OUT_OF_REACH,
  SIGNED_IN,
  type Somebody,
} from './everybody'

export type Row = {
  /** who gets in; anybody else who is signed in is refused, and whoever is not is asked to sign in */
  readonly lets: readonly Somebody[]
  /** whose role would do, and to whom this very thing is not there */
  readonly hides?: readonly Somebody[]
  /** what follows the path: `?q=row` */
  readonly query?: string
}

const row = (lets: readonly Somebody[], hides: readonly Somebody[] = [], query = ''): Row => ({
  lets: lets.filter((one) => !hides.includes(one)),
  hides,
  query,
})

/** By file. A page that refuses says "not found", and so does a page that hides. */
export const PAGES: Readonly<Record<string, Row>> = {
  'app/(public)/page.tsx': row(EVERYBODY),
  'app/(public)/sign-in/page.tsx': row(EVERYBODY),
  'app/(public)/sign-up/page.tsx': row(EVERYBODY),
  'app/(public)/forgotten-password/page.tsx': row(EVERYBODY),
  'app/(public)/reset-password/[token]/page.tsx': row(EVERYBODY),
  'app/(public)/accept-invitation/[token]/page.tsx': row(EVERYBODY),
  'app/(office)/today/page.tsx': row(OFFICE),
  'app/(office)/homes/page.tsx': row(OFFICE),
  'app/(office)/homes/[homeId]/page.tsx': row(OFFICE, OUT_OF_REACH),
  'app/(office)/homes/[homeId]/defect/page.tsx': row(EDITORS, OUT_OF_REACH),
  'app/(office)/homes/[homeId]/facts/page.tsx': row(EDITORS, OUT_OF_REACH),
  'app/(office)/homes/[homeId]/identity/page.tsx': row(EDITORS, OUT_OF_REACH),
  'app/(office)/homes/[homeId]/inspection/page.tsx': row(EDITORS, OUT_OF_REACH),
  'app/(office)/homes/new/page.tsx': row(MANAGERS),
  'app/(office)/map/page.tsx': row(OFFICE),
  'app/(office)/imports/page.tsx': row(AUDITED),
  'app/(office)/imports/new/page.tsx': row(MANAGERS),
  'app/(office)/imports/[importId]/page.tsx': row(AUDITED, ELSEWHERE),
  'app/(office)/people/page.tsx': row(AUDITED),
  'app/(office)/people/[personId]/page.tsx': row(MANAGERS, ELSEWHERE),
  'app/(office)/settings/page.tsx': row(AUDITED),
  'app/(office)/settings/password/page.tsx': row(SIGNED_IN),
  'app/(office)/audit/page.tsx': row(AUDITED),
  'app/(contractor)/visits/page.tsx': row(CONTRACTORS),
}

/** By method and file. A handler refuses with 401 or 403, and hides with 404. */
export const HANDLERS: Readonly<Record<string, Row>> = {
  'GET app/api/health/route.ts': row(EVERYBODY),
  'GET app/api/auth/[...nextauth]/route.ts': row(EVERYBODY),
  'POST app/api/auth/[...nextauth]/route.ts': row(EVERYBODY),
  'GET app/api/v1/homes/route.ts': row(OFFICE),
  'GET app/api/v1/homes/export/route.ts': row(OFFICE, [], '?format=csv'),
  'GET app/api/v1/homes/search/route.ts': row(OFFICE, [], '?q=row'),
  'GET app/api/v1/map/route.ts': row(OFFICE, [], '?box=-1,50,1,52&zoom=8'),
  'POST app/api/v1/imports/route.ts': row(MANAGERS),
  'GET app/api/v1/imports/[importId]/progress/route.ts': row(AUDITED, ELSEWHERE),
  'GET app/api/v1/imports/[importId]/rejected/route.ts': row(AUDITED, ELSEWHERE, '?format=csv'),
}

export type ActionRow = Row & {
  /** the use-case that the action calls */
  readonly useCase: string
  /** the permission that the use-case demands; null: being signed in, or nothing, is enough */
  readonly needs: Permission | null
  /** where an action without a permission is tried */
  readonly triedIn?: string
}

const guarded = (
  useCase: string,
  needs: Permission,
  lets: readonly Somebody[],
  hides?: readonly Somebody[],
): ActionRow => ({
  ...row(lets, hides),
  useCase,
  needs,
})
const open = (useCase: string, lets: readonly Somebody[], triedIn: string): ActionRow => ({
  ...row(lets),
  useCase,
  needs: null,
  triedIn,
})

/** By file and name. */
export const ACTIONS: Readonly<Record<string, ActionRow>> = {
  'app/actions.ts#signOut': open('endSession', EVERYBODY, 'tests/db/people/sign-in.test.ts'),
  'app/actions.ts#switchTo': open('switchOrganisation', SIGNED_IN, 'tests/db/people/access.test.ts'),
  'app/(public)/sign-in/actions.ts#enter': open('signIn', EVERYBODY, 'tests/db/people/sign-in.test.ts'),
  'app/(public)/sign-up/actions.ts#begin': open('signUp', EVERYBODY, 'tests/db/people/sign-up.test.ts'),
  'app/(public)/forgotten-password/actions.ts#ask': open(
    'askForReset',
    EVERYBODY,
    'tests/db/people/reset-password.test.ts',
  ),
  'app/(public)/reset-password/[token]/actions.ts#choosePassword': open(
    'resetPassword',
    EVERYBODY,
    'tests/db/people/reset-password.test.ts',
  ),
  'app/(public)/accept-invitation/[token]/actions.ts#accept': open(
    'acceptInvitation',
    EVERYBODY,
    'tests/db/people/invitation.test.ts',
  ),
  'app/(office)/settings/password/actions.ts#change': open(
    'changePassword',
    SIGNED_IN,
    'tests/db/people/reset-password.test.ts',
  ),
  'app/(office)/people/actions.ts#invite': guarded('invitePerson', 'people.manage', MANAGERS),
  'app/(office)/people/actions.ts#resend': guarded('resendInvitation', 'people.manage', MANAGERS, ELSEWHERE),
  'app/(office)/people/actions.ts#withdraw': guarded(
    'withdrawInvitation',
    'people.manage',
    MANAGERS,
    ELSEWHERE,
  ),
  'app/(office)/people/[personId]/actions.ts#change': guarded(
    'changeAccess',
    'people.manage',
    MANAGERS,
    ELSEWHERE,
  ),
  'app/(office)/people/[personId]/actions.ts#end': guarded('endAccess', 'people.manage', MANAGERS, ELSEWHERE),
  'app/(office)/settings/actions.ts#change': guarded('changeSettings', 'organisation.manage', MANAGERS),
  'app/(office)/settings/actions.ts#add': guarded('addPatch', 'organisation.manage', MANAGERS),
  'app/(office)/settings/actions.ts#rename': guarded(
    'renamePatch',
    'organisation.manage',
    MANAGERS,
    ELSEWHERE,
  ),
  'app/(office)/homes/new/actions.ts#add': guarded('addHome', 'homes.add', MANAGERS),
  'app/(office)/homes/[homeId]/actions.ts#correctFacts': guarded(
    'recordFact',
    'homes.edit',
    EDITORS,
    OUT_OF_REACH,
  ),
  'app/(office)/homes/[homeId]/actions.ts#record': guarded(
    'recordInspection',
    'homes.edit',
    EDITORS,
    OUT_OF_REACH,
  ),
  'app/(office)/homes/[homeId]/actions.ts#add': guarded('addDefect', 'homes.edit', EDITORS, OUT_OF_REACH),
  'app/(office)/homes/[homeId]/actions.ts#close': guarded('closeDefect', 'homes.edit', EDITORS, OUT_OF_REACH),
  'app/(office)/homes/[homeId]/actions.ts#change': guarded('changeHome', 'homes.edit', EDITORS, OUT_OF_REACH),
  'app/(office)/imports/actions.ts#chooseSheet': guarded('changeLayout', 'imports.run', MANAGERS, ELSEWHERE),
  'app/(office)/imports/actions.ts#check': guarded('startCheck', 'imports.run', MANAGERS, ELSEWHERE),
  'app/(office)/imports/actions.ts#confirm': guarded('confirmImport', 'imports.run', MANAGERS, ELSEWHERE),
  'app/(office)/imports/actions.ts#cancel': guarded('cancelImport', 'imports.run', MANAGERS, ELSEWHERE),
}
