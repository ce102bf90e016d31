'use client'
import Link from 'next/link'
import { usePathname } from 'next/navigation'
import { classNames } from '@/components/ui/class-names'
import { isAt, type Place } from './navigation'

/** The main places, the one where we are underlined in copper. */
export function PlaceLinks({ places }: { places: readonly Place[] }) {
  const path = usePathname()
  return (
    <nav aria-label="Main" className="h-full">
      <ul className="flex h-full items-stretch gap-1 sm:gap-2">
        {places.map(({ href, label }) => {
          const here = isAt(path, href)
          return (
            <li key={href} className="flex">
              <Link
                href={href}
                aria-current={here ? (path === href ? 'page' : 'true') : undefined}
                className={classNames(
                  'flex items-center border-y-[3px] border-t-transparent px-2 -outline-offset-4 sm:px-2.5',
                  here
                    ? 'border-b-copper font-semibold text-ink'
                    : 'border-b-transparent text-slate hover:text-ink',
                )}
              >
                {label}
              </Link>
            </li>
          )
        })}
      </ul>
    </nav>
  )
}
