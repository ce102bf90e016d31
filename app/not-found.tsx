import Link from 'next/link'
import { connection } from 'next/server'
import { NothingHere } from '@/components/people/nothing-here'
import { BrandMark } from '@/components/shell/brand-mark'

/**
 * For addresses that are no page. It waits for the request, since a page made when the site is built has no nonce and
 * would be refused by its own content policy.
 */
export default async function NotFoundPage() {
  await connection()
  return (
    <>
      <header className="page-width flex min-h-16 items-center">
        <Link href="/" className="flex min-h-control items-center gap-2.5">
          <BrandMark />
          <span className="font-display text-xl font-bold tracking-tight">Fuseward</span>
        </Link>
      </header>
      <main className="page-width">
        <NothingHere />
      </main>
    </>
  )
}
