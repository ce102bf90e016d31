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
  { name: 'home', path: '/homes', as: ['manager', 'officer', 'landlord'], click: ['main tbody a >> nth=0'] },
  { name: 'map', path: '/map', as: ['manager', 'landlord'] },
  { name: 'imports', path: '/imports', as: ['manager', 'auditor'] },
  { name: 'import-new', path: '/imports/new', as: ['manager'] },
  { name: 'people', path: '/people', as: ['manager', 'auditor'] },
  { name: 'settings', path: '/settings', as: ['manager', 'auditor'] },
  { name: 'visits', path: '/visits', as: ['supervisor', 'electrician'] },
]
