import Link from 'next/link'
import { type Actor } from '@/lib/access/actor'
import { can } from '@/lib/access/can'
import { ROLE_NAMES } from '@/lib/access/role'
import { type OrganisationChoice } from '@/lib/organisations/organisation'
import { BrandMark } from './brand-mark'
import { HomeSearch } from './home-search'
import { navigationFor } from './navigation'
import { OrganisationMenu } from './organisation-menu'
import { PlaceLinks } from './place-links'

type Props = {
  actor: Actor
  others: readonly OrganisationChoice[]
  onSwitch: (form: FormData) => Promise<void>
  onSignOut: () => Promise<void>
}

/** The bar over every page of the office: where to go, what to find, which organisation this is. */
export function TopBar({ actor, others, onSwitch, onSignOut }: Props) {
  const { places, organisation } = navigationFor(actor)
  const mayFind = can(actor, 'homes.read')
  return (
    <header className="no-print border-b border-line bg-surface">
      <div className="page-width flex min-h-15 flex-wrap items-center gap-x-2 lg:gap-x-4">
        <Link href={places[0]?.href ?? '/'} className="flex min-h-control items-center gap-2.5 pr-1">
          <BrandMark />
          <span className="font-display text-xl font-bold tracking-tight max-sm:sr-only">Fuseward</span>
        </Link>
        <div className="self-stretch">
          <PlaceLinks places={places} />
        </div>
        <div className="ml-auto lg:order-last lg:ml-0">
          <OrganisationMenu
            organisationName={actor.organisationName}
            personName={actor.name}
            roleName={ROLE_NAMES[actor.role]}
            places={organisation}
            others={others}
            onSwitch={onSwitch}
            onSignOut={onSignOut}
          />
        </div>
        {mayFind && <HomeSearch className="w-full max-lg:order-last max-lg:mb-3 lg:ml-auto lg:w-76" />}
      </div>
    </header>
  )
}
