import Link from 'next/link'
import { type ReactNode } from 'react'
import { BrandMark } from '@/components/shell/brand-mark'
import { Footer } from '@/components/shell/footer'
import { SkipLink } from '@/components/shell/skip-link'
import { StreetEdge } from '@/components/shell/street-edge'
import { ButtonLink } from '@/components/ui/button-link'
import { landingPathOf } from '@/lib/access/landing-path-of'
import { optionalActor } from '../session'

export default async function PublicLayout({ children }: { children: ReactNode }) {
  const actor = await optionalActor()
  return (
    <div className="flex min-h-dvh flex-col overflow-x-clip">
      <SkipLink />
      <header className="no-print">
        <div className="page-width flex min-h-16 flex-wrap items-center justify-between gap-x-4">
          <Link href="/" className="flex min-h-control items-center gap-2.5">
            <BrandMark />
            <span className="font-display text-xl font-bold tracking-tight">Fuseward</span>
          </Link>
          {actor ? (
            <ButtonLink href={landingPathOf(actor)} kind="quiet" size="compact">
              Go to {actor.organisationName}
            </ButtonLink>
          ) : (
            <ButtonLink href="/sign-in" kind="quiet" size="compact">
              Sign in
            </ButtonLink>
          )}
        </div>
      </header>
      <main id="main" tabIndex={-1} className="page-width flex-1 outline-none">
        {children}
      </main>
      <StreetEdge />
      <Footer flush />
    </div>
  )
}
