'use client'
import { useId, useState } from 'react'
import { ChoiceRow } from '@/components/ui/choice-row'
import { TextField } from '@/components/ui/text-field'
import { PASSWORD_MINIMUM } from '@/lib/access/password-problem'

type Props = { label: string; name?: string; isNew?: boolean }

const HINT = `${PASSWORD_MINIMUM} characters or more. Three or four unrelated words are easy to keep and hard to guess.`

/** A password, which can be pasted and looked at. A new one is typed once, because it can be looked at. */
export function PasswordField({ label, name = 'password', isNew = false }: Props) {
  const [shown, setShown] = useState(false)
  const id = useId()
  return (
    <>
      <TextField
        name={name}
        type={shown ? 'text' : 'password'}
        label={label}
        hint={isNew ? HINT : undefined}
        autoComplete={isNew ? 'new-password' : 'current-password'}
        autoCapitalize="off"
        spellCheck={false}
      />
      <div className="-mt-4 mb-6">
        <ChoiceRow
          type="checkbox"
          id={id}
          label={`Show ${label.charAt(0).toLowerCase()}${label.slice(1)}`}
          checked={shown}
          onChange={(event) => setShown(event.target.checked)}
        />
      </div>
    </>
  )
}
