/** The pages and states that a picture is taken of, and as whom. */
import { type Role } from '@/lib/access/role'

/** `visitor` is signed out; `landlord` manages the small organisation of the demo, the roles are people of the large one. */
export type Viewer = 'visitor' | 'landlord' | Role

export type PictureOf = {
  /** the picture's file is called `<name>-<viewer>-<width>-<theme>.png` */
  readonly name: string
  readonly path: string
  readonly as: readonly Viewer[]
  /** what to click, one after another, before the picture: CSS or Playwright's `text=` */
  readonly click?: readonly string[]
  /** what must be there before the picture */
  readonly until?: string
}

/** The first home of a list, and what shows that its page has come. */
const FIRST_HOME = 'main tbody th a >> nth=0'
const OF_A_HOME = 'h2:has-text("Why it ranks")'

const OFFICE = ['manager', 'officer', 'auditor'] as const

export const PAGES: readonly PictureOf[] = [
  { name: 'landing', path: '/', as: ['visitor'] },
  { name: 'sign-in', path: '/sign-in', as: ['visitor'] },
  {
    name: 'sign-in-problems',
    path: '/sign-in',
    as: ['visitor'],
    click: ['main button[type=submit]'],
    until: '[role=alert]',
  },
  { name: 'sign-up', path: '/sign-up', as: ['visitor'] },
  { name: 'forgotten-password', path: '/forgotten-password', as: ['visitor'] },
  { name: 'not-found', path: '/nowhere', as: ['visitor', 'manager'] },
  { name: 'today', path: '/today', as: [...OFFICE, 'landlord'] },
  { name: 'homes', path: '/homes', as: [...OFFICE, 'landlord'] },
  {
    name: 'homes-rewireable',
    path: '/homes?board=rewireable-ways&standing=lapsed',
    as: ['manager', 'officer'],
  },
  { name: 'homes-none', path: '/homes?search=no+such+home', as: ['manager'] },
  {
    name: 'homes-columns',
    path: '/homes?search=tansy&columns=board,cover,built,inspected,standing,defects,score,patch,block,tenure,type,wiring,rewired,bedrooms,reference,uprn,nation',
    as: ['manager'],
  },
  {
    name: 'homes-filter',
    path: '/homes',
    as: ['manager'],
    click: ['main button:has-text("RCD cover")'],
    until: '[role=dialog]',
  },
  {
    name: 'home',
    path: '/homes',
    as: ['manager', 'officer', 'auditor', 'landlord'],
    click: [FIRST_HOME],
    until: OF_A_HOME,
  },
  {
    name: 'home-unknown',
    path: '/homes?standing=unknown+date',
    as: ['manager'],
    click: [FIRST_HOME],
    until: OF_A_HOME,
  },
  {
    name: 'home-facts',
    path: '/homes',
    as: ['manager'],
    click: [FIRST_HOME, 'main a:has-text("Correct facts") >> nth=0'],
    until: 'main form',
  },
  {
    name: 'home-inspection',
    path: '/homes',
    as: ['manager'],
    click: [FIRST_HOME, 'main a:has-text("Record an inspection") >> nth=0'],
    until: 'main form',
  },
  {
    name: 'home-defect',
    path: '/homes',
    as: ['manager'],
    click: [FIRST_HOME, 'main a:has-text("Add a defect") >> nth=0'],
    until: 'main form',
  },
  {
    name: 'home-identity',
    path: '/homes',
    as: ['manager'],
    click: [FIRST_HOME, 'main a:has-text("Change address") >> nth=0'],
    until: 'main form',
  },
  { name: 'home-new', path: '/homes/new', as: ['manager', 'landlord'] },
  { name: 'map', path: '/map', as: ['manager', 'officer', 'landlord'] },
  { name: 'map-near', path: '/map?standing=lapsed&board=rewireable-ways', as: ['manager'] },
  { name: 'imports', path: '/imports', as: ['manager', 'auditor'] },
  {
    name: 'import',
    path: '/imports',
    as: ['manager'],
    click: ['main tbody a >> nth=0'],
    until: 'h2:has-text("Rows to look at")',
  },
  { name: 'import-new', path: '/imports/new', as: ['manager'] },
  { name: 'people', path: '/people', as: ['manager', 'auditor'] },
  { name: 'settings', path: '/settings', as: ['manager', 'auditor'] },
  { name: 'password', path: '/settings/password', as: ['manager'] },
  { name: 'audit', path: '/audit', as: ['manager', 'auditor'] },
  { name: 'visits', path: '/visits', as: ['supervisor', 'electrician'] },
]
