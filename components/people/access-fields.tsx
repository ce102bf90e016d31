'use client'
import { useState } from 'react'
import { CheckboxGroup, RadioGroup } from '@/components/ui/choice-group'
import { type Role, ROLE_NAMES, ROLES } from '@/lib/access/role'

const WHAT: Record<Role, string> = {
  manager: 'Everything, settings and people too',
  officer: 'Homes of their patches, and corrections to them; no settings',
  auditor: 'Reads and exports everything, changes nothing',
  supervisor: 'Only work issued to their firm',
  electrician: 'Only visits assigned to them',
}
const CHOICES = ROLES.map((value) => ({ value, label: ROLE_NAMES[value], hint: WHAT[value] }))

type Props = {
  patches: readonly { readonly id: string; readonly name: string }[]
  role?: Role
  patchIds?: readonly string[]
}

/** A role, and for an officer the patches. Patches chosen for another role are not kept. */
export function AccessFields({ patches, role, patchIds = [] }: Props) {
  const [chosen, setChosen] = useState<string | undefined>(role)
  const needsPatches = patches.length > 0 && chosen === 'officer'
  return (
    <>
      <div onChange={(event) => setChosen((event.target as HTMLInputElement).value)}>
        <RadioGroup name="role" legend="Role" choices={CHOICES} defaultValue={role} />
      </div>
      {needsPatches && (
        <CheckboxGroup
          name="patchIds"
          legend="Patches they answer for"
          hint="Choose none, and they see every home."
          choices={patches.map(({ id, name }) => ({ value: id, label: name }))}
          defaultValue={patchIds}
        />
      )}
    </>
  )
}
