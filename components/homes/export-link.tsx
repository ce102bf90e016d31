'use client'
import { DropdownMenu } from 'radix-ui'
import { type ReactNode } from 'react'

/** A file to save, in a menu: an ordinary link, so that the browser saves it and the page stays. */
export function ExportLink({ href, children }: { href: string; children: ReactNode }) {
  return (
    <DropdownMenu.Item asChild>
      <a
        href={href}
        download
        className="flex min-h-9 items-center rounded-plate px-3 py-1.5 outline-none data-[highlighted]:bg-copper-wash data-[highlighted]:text-copper"
      >
        {children}
      </a>
    </DropdownMenu.Item>
  )
}
