import { type Metadata } from 'next'
import { requireActor } from '@/app/session'
import { show } from '@/app/show'
import { ImportScreen } from '@/components/imports/import-screen'
import { can } from '@/lib/access/can'
import { showImport, ShowImport } from '@/lib/use-cases/imports/show-import'
import { NotFound } from '@/lib/errors/expected'
import { cancel, check, chooseSheet, confirm } from '../actions'

export const metadata: Metadata = { title: 'Import' }

type Props = {
  params: Promise<{ importId: string }>
  searchParams: Promise<Record<string, string | string[] | undefined>>
}

export default async function ImportPage({ params, searchParams }: Props) {
  const actor = await requireActor()
  const asked = ShowImport.safeParse({ ...(await searchParams), ...(await params) })
  const shown = await show(
    asked.success ? showImport(actor, asked.data) : Promise.reject(new NotFound('That import')),
  )
  return (
    <ImportScreen
      shown={shown}
      mayRun={can(actor, 'imports.run')}
      isFirstPage={!asked.data?.after}
      actions={{ chooseSheet, check, confirm, cancel }}
    />
  )
}
