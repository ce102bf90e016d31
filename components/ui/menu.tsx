'use client'
import Link from 'next/link'
import { DropdownMenu } from 'radix-ui'
import { type ReactNode } from 'react'
import { buttonClass } from './button-class'

const item =
  'flex min-h-9 w-full cursor-pointer items-center gap-2 rounded-plate px-3 py-1.5 text-left outline-none select-none data-[highlighted]:bg-copper-wash data-[highlighted]:text-copper'

type Props = {
  trigger: ReactNode
  triggerClass?: string
  label?: string
  align?: 'start' | 'end'
  children: ReactNode
}

/** A menu of things to do or places to go, under a button. */
export function Menu({ trigger, triggerClass, label, align = 'end', children }: Props) {
  return (
    <DropdownMenu.Root modal={false}>
      <DropdownMenu.Trigger
        aria-label={label}
        className={triggerClass ?? buttonClass('secondary', 'compact')}
      >
        {trigger}
      </DropdownMenu.Trigger>
      <DropdownMenu.Portal>
        <DropdownMenu.Content
          align={align}
          sideOffset={6}
          collisionPadding={12}
          className="z-50 max-h-[var(--radix-dropdown-menu-content-available-height)] max-w-[calc(100vw-1.5rem)] min-w-56 overflow-y-auto rounded-control border border-edge bg-surface p-1.5 text-ink"
        >
          {children}
        </DropdownMenu.Content>
      </DropdownMenu.Portal>
    </DropdownMenu.Root>
  )
}

/** A place to go. */
export function MenuLink({
  href,
  current,
  children,
}: {
  href: string
  current?: boolean
  children: ReactNode
}) {
  return (
    <DropdownMenu.Item asChild>
      <Link
        href={href}
        aria-current={current ? 'page' : undefined}
        className={`${item} ${current ? 'font-semibold' : ''}`}
      >
        {children}
      </Link>
    </DropdownMenu.Item>
  )
}

/** A thing to do. */
export function MenuAction({ onSelect, children }: { onSelect: () => void; children: ReactNode }) {
  return (
    <DropdownMenu.Item onSelect={onSelect} className={item}>
      {children}
    </DropdownMenu.Item>
  )
}

/** A heading inside a menu. */
export function MenuLabel({ children }: { children: ReactNode }) {
  return <DropdownMenu.Label className="px-3 pt-2 pb-1 text-sm text-slate">{children}</DropdownMenu.Label>
}

/** A line between two parts of a menu. */
export function MenuDivider() {
  return <DropdownMenu.Separator className="my-1.5 h-px bg-line" />
}
