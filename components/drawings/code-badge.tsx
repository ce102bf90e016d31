'use client'
import { Tooltip } from 'radix-ui'
import { useState } from 'react'
import { classNames } from '@/components/ui/class-names'
import { CODE_MEANINGS, type ClassificationCode } from '@/lib/homes/classification-code'

const LOOKS: Record<ClassificationCode, string> = {
  C1: 'border-madder bg-madder text-on-madder',
  C2: 'border-madder bg-madder-wash text-madder',
  C3: 'border-edge bg-surface text-ink',
  FI: 'border-dashed border-blueprint bg-surface text-blueprint',
}

type Props = {
  code: ClassificationCode
  /** how many, before the code */
  count?: number
  /** in a list: no tab stop of its own; the meaning is read out, and stands in the title */
  plain?: boolean
}

/** An inspector's code, with what it means on hover, focus and tap. */
export function CodeBadge({ code, count, plain }: Props) {
  const [open, setOpen] = useState(false)
  const look = classNames(
    'inline-flex min-h-6 min-w-8 items-center justify-center rounded-plate border px-1.5 text-sm font-bold whitespace-nowrap',
    LOOKS[code],
  )
  const words = count === undefined ? code : `${count} ${code}`
  if (plain) {
    return (
      <span className={look} title={CODE_MEANINGS[code]}>
        {words}
        <span className="sr-only">, {CODE_MEANINGS[code]}</span>
      </span>
    )
  }
  return (
    <Tooltip.Provider delayDuration={150}>
      <Tooltip.Root open={open} onOpenChange={setOpen}>
        <Tooltip.Trigger
          className={look}
          onClick={(event) => {
            event.preventDefault() // a tap opens it; the library would close it
            setOpen(true)
          }}
        >
          {words}
        </Tooltip.Trigger>
        <Tooltip.Portal>
          <Tooltip.Content
            sideOffset={6}
            collisionPadding={12}
            className="z-50 max-w-64 rounded-plate bg-ink px-3 py-1.5 text-sm text-paper"
          >
            {code}: {CODE_MEANINGS[code]}
          </Tooltip.Content>
        </Tooltip.Portal>
      </Tooltip.Root>
    </Tooltip.Provider>
  )
}
