import { type Invitation } from '@/lib/people/invitation'
import { type Membership } from '@/lib/people/membership'

type PatchNames = { readonly patchNames: 'all' | readonly string[] }

export type PersonLine = Membership & PatchNames & { readonly isSelf: boolean }
export type InvitationLine = Invitation & PatchNames & { readonly hasRunOut: boolean }
