import { connection } from 'next/server'
import { NothingHere } from '@/components/people/nothing-here'

/**
 * For addresses that are no page. It waits for the request, since a page made when the site is built has no nonce and
 * would be refused by its own content policy.
 */
export default async function NotFoundPage() {
  await connection()
  return (
    <main className="page-width">
      <NothingHere />
    </main>
  )
}
