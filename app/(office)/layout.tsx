import { type ReactNode, Suspense } from 'react'
import { signOut, switchTo } from '@/app/actions'
import { requireActor } from '@/app/session'
import { Footer } from '@/components/shell/footer'
import { GoingBar } from '@/components/shell/going-bar'
import { QueryProvider } from '@/components/shell/query-provider'
import { SkipLink } from '@/components/shell/skip-link'
import { TopBar } from '@/components/shell/top-bar'
import { listOrganisations } from '@/lib/use-cases/people/list-organisations'

/** The frame of every page for those who are signed in. It is no guard: each page and action asks for the actor itself. */
export default async function OfficeLayout({ children }: { children: ReactNode }) {
  const actor = await requireActor()
  const organisations = await listOrganisations(actor)
  const others = organisations.filter(({ organisationId }) => organisationId !== actor.organisationId)
  return (
    <QueryProvider key={actor.organisationId}>
      <div className="flex min-h-dvh flex-col">
        <SkipLink />
        <Suspense>
          <GoingBar />
        </Suspense>
        <TopBar actor={actor} others={others} onSwitch={switchTo} onSignOut={signOut} />
        <main id="main" tabIndex={-1} className="page-width flex-1 outline-none">
          {children}
        </main>
        <Footer />
      </div>
    </QueryProvider>
  )
}
