import 'server-only'
import { cache } from 'react'
import { notFound } from 'next/navigation'
import { requireActor } from '@/app/session'
import { show } from '@/app/show'
import { today } from '@/lib/platform/clock'
import { type HomeOnRecord, showHome } from '@/lib/use-cases/homes/show-home'

/** The home of a page, read once a request: its title and its screen ask for the same. */
export const readHome = cache(async (homeId: string): Promise<HomeOnRecord> =>
  show(showHome(await requireActor(), homeId, today())),
)

/** The same for a page that changes it: for somebody who may not, it is not there. */
export async function readHomeToEdit(homeId: string): Promise<HomeOnRecord> {
  const shown = await readHome(homeId)
  if (!shown.mayEdit) notFound()
  return shown
}
