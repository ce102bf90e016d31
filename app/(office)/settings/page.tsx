import { type Metadata } from 'next'
import { requireActor } from '@/app/session'
import { show } from '@/app/show'
import { SettingsScreen } from '@/components/people/settings-screen'
import { can } from '@/lib/access/can'
import { readSettings } from '@/lib/use-cases/organisations/read-settings'
import { add, change, rename } from './actions'

export const metadata: Metadata = { title: 'Settings' }

export default async function SettingsPage() {
  const actor = await requireActor()
  const settings = await show(readSettings(actor))
  const mayManage = can(actor, 'organisation.manage')
  return (
    <SettingsScreen
      {...settings}
      mayManage={mayManage}
      onChange={change}
      onAddPatch={add}
      onRenamePatch={rename}
    />
  )
}
