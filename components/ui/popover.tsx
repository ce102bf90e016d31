'use client'
import { Popover as Radix } from 'radix-ui'
import { type ReactNode, useState } from 'react'
import { chipClass } from './filter-chip'

type Props = {
  trigger: ReactNode
  /** names the panel */
  label: string
  /** the trigger is drawn as switched on */
  active?: boolean
  triggerClass?: string
  align?: 'start' | 'center' | 'end'
  children: ReactNode | ((close: () => void) => ReactNode)
}

/** A panel under a chip or a button: a filter's choices, the columns to show. */
export function Popover({ trigger, label, active = false, triggerClass, align = 'start', children }: Props) {
  const [open, setOpen] = useState(false)
  return (
    <Radix.Root open={open} onOpenChange={setOpen}>
      <Radix.Trigger className={triggerClass ?? chipClass(active)}>
        {trigger}
        <svg viewBox="0 0 10 6" className="w-2.5 shrink-0" aria-hidden="true">
          <path d="M1 1l4 4 4-4" fill="none" stroke="currentColor" strokeWidth="1.5" />
        </svg>
      </Radix.Trigger>
      <Radix.Portal>
        <Radix.Content
          aria-label={label}
          align={align}
          sideOffset={6}
          collisionPadding={12}
          className="z-50 max-h-[var(--radix-popover-content-available-height)] w-72 max-w-[calc(100vw-1.5rem)] overflow-y-auto rounded-control border border-edge bg-surface p-4 text-ink"
        >
          {typeof children === 'function' ? children(() => setOpen(false)) : children}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  )
}
