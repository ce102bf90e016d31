'use client'
import { usePathname } from 'next/navigation'
import { useTransition } from 'react'
import { Menu, MenuAction, MenuDivider, MenuLabel, MenuLink } from '@/components/ui/menu'
import { type OrganisationChoice } from '@/lib/organisations/organisation'
import { isAt, type Place } from './navigation'

type Props = {
  organisationName: string
  personName: string
  roleName: string
  places: readonly Place[]
  /** other organisations that this person belongs to */
  others: readonly OrganisationChoice[]
  onSwitch: (form: FormData) => Promise<void>
  onSignOut: () => Promise<void>
}

/** The organisation's menu: what belongs to it, the way to another one, and out. */
export function OrganisationMenu({
  organisationName,
  personName,
  roleName,
  places,
  others,
  onSwitch,
  onSignOut,
}: Props) {
  const path = usePathname()
  const [pending, start] = useTransition()
  const change = (organisationId: string) => {
    const form = new FormData()
    form.set('organisationId', organisationId)
    start(() => onSwitch(form))
  }
  return (
    <Menu
      triggerClass="no-print flex min-h-9 max-w-56 items-center gap-1.5 rounded-control px-2 text-left font-semibold hover:bg-sunken aria-expanded:bg-sunken"
      trigger={
        <>
          <span className="hidden truncate sm:block">{pending ? 'One moment…' : organisationName}</span>
          <span className="sr-only sm:hidden">Menu of {organisationName}</span>
          <svg viewBox="0 0 20 20" className="size-6 sm:hidden" aria-hidden="true">
            <path d="M2 5h16M2 10h16M2 15h16" stroke="currentColor" strokeWidth="2" />
          </svg>
          <svg viewBox="0 0 10 6" className="hidden w-2.5 shrink-0 sm:block" aria-hidden="true">
            <path d="M1 1l4 4 4-4" fill="none" stroke="currentColor" strokeWidth="1.6" />
          </svg>
        </>
      }
    >
      <MenuLabel>
        <span className="block font-semibold text-ink sm:hidden">{organisationName}</span>
        {personName}, {roleName.charAt(0).toLowerCase() + roleName.slice(1)}
      </MenuLabel>
      {places.map(({ href, label }) => (
        <MenuLink key={href} href={href} current={isAt(path, href)}>
          {label}
        </MenuLink>
      ))}
      {others.length > 0 && (
        <>
          <MenuDivider />
          <MenuLabel>Go to another organisation</MenuLabel>
          {others.map(({ organisationId, name }) => (
            <MenuAction key={organisationId} onSelect={() => change(organisationId)}>
              {name}
            </MenuAction>
          ))}
        </>
      )}
      <MenuDivider />
      <MenuLink href="/settings/password" current={isAt(path, '/settings/password')}>
        Change your password
      </MenuLink>
      <MenuAction onSelect={() => start(() => onSignOut())}>Sign out</MenuAction>
    </Menu>
  )
}
