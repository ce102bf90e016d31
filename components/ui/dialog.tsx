'use client'
import { Dialog as Radix } from 'radix-ui'
import { type ReactNode, useState } from 'react'
import { buttonClass, type ButtonKind, type ButtonSize } from './button-class'

type Props = {
  /** what the button that opens it says */
  trigger: ReactNode
  triggerKind?: ButtonKind
  triggerSize?: ButtonSize
  title: ReactNode
  /** what will happen, before it is confirmed */
  description?: ReactNode
  /** the content; given as a function, it gets what closes the dialog */
  children: ReactNode | ((close: () => void) => ReactNode)
}

/** A question or a short form over the page. It keeps the focus inside, and gives it back. */
export function Dialog({
  trigger,
  triggerKind = 'secondary',
  triggerSize,
  title,
  description,
  children,
}: Props) {
  const [open, setOpen] = useState(false)
  return (
    <Radix.Root open={open} onOpenChange={setOpen}>
      <Radix.Trigger className={buttonClass(triggerKind, triggerSize)}>{trigger}</Radix.Trigger>
      <Radix.Portal>
        <Radix.Overlay className="fixed inset-0 z-40 bg-[color-mix(in_srgb,var(--ink)_45%,transparent)] dark:bg-[color-mix(in_srgb,var(--paper)_75%,transparent)]" />
        <Radix.Content
          {...(description ? {} : { 'aria-describedby': undefined })}
          className="fixed top-1/2 left-1/2 z-50 max-h-[90dvh] w-[min(36rem,calc(100vw-2rem))] -translate-x-1/2 -translate-y-1/2 overflow-y-auto rounded-control border border-edge bg-surface p-5 sm:p-6"
        >
          <div className="flex items-start justify-between gap-4">
            <Radix.Title className="text-xl">{title}</Radix.Title>
            <Radix.Close className={buttonClass('quiet', 'compact', '-mt-1 -mr-2')}>
              <span className="sr-only">Close</span>
              <span aria-hidden="true">✕</span>
            </Radix.Close>
          </div>
          {description && <Radix.Description className="mt-2 text-slate">{description}</Radix.Description>}
          <div className="mt-5">
            {typeof children === 'function' ? children(() => setOpen(false)) : children}
          </div>
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  )
}
