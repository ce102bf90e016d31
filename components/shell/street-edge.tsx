'use client'
import { usePathname } from 'next/navigation'
import { StreetHome } from '@/components/drawings/street-home'
import { classNames } from '@/components/ui/class-names'

const HOMES = [1937, 1911, 1964, 2019, 1983] as const

/** The street that the public pages stand on, at their foot. The first page has it at its head already. */
export function StreetEdge() {
  const isFirstPage = usePathname() === '/'
  if (isFirstPage) return <div className="h-16 border-b border-line" />
  return (
    <div className="no-print page-width flex justify-end pt-16" aria-hidden="true">
      {HOMES.map((year, at) => (
        <StreetHome
          key={year}
          year={year}
          runsOn={at === 0}
          className={classNames('block w-1/3 sm:w-1/5 lg:w-32', at > 2 && 'max-sm:hidden')}
        />
      ))}
    </div>
  )
}
