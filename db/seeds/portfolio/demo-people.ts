/** The people of the demo: invented names at example domains, one password. */
import { type Role } from '@/lib/access/role'

export const DEMO_PASSWORD = 'copper turns verdigris'

export type DemoPerson = {
  readonly name: string
  readonly email: string
  readonly role: Role
  /** names of patches; all of them where it is left out */
  readonly patches?: readonly string[]
}

export const PROVIDER_PEOPLE: readonly DemoPerson[] = [
  { name: 'Ifeoma Castledine', email: 'manager@larrowside.example', role: 'manager' },
  { name: 'Tomasz Birkett', email: 'officer@larrowside.example', role: 'officer', patches: ['Netherfold'] },
  { name: 'Rhona Applegarth', email: 'officer.all@larrowside.example', role: 'officer' },
  { name: 'Gulshan Merriwether', email: 'auditor@larrowside.example', role: 'auditor' },
  { name: 'Declan Oyelaran', email: 'supervisor@fathom-electrical.example', role: 'supervisor' },
  { name: 'Saoirse Whitlam', email: 'electrician@fathom-electrical.example', role: 'electrician' },
]

export const LANDLORD_PEOPLE: readonly DemoPerson[] = [
  { name: 'Mair Penhallow', email: 'landlord@tai-aberllinos.example', role: 'manager' },
  { name: 'Gethin Rowlatt', email: 'lettings@tai-aberllinos.example', role: 'officer' },
  { name: 'Eirlys Cadwgan', email: 'accounts@tai-aberllinos.example', role: 'auditor' },
  { name: 'Bedwyr Ansah', email: 'supervisor@gwifren-goch.example', role: 'supervisor' },
  { name: 'Lowri Tavener', email: 'electrician@gwifren-goch.example', role: 'electrician' },
]
