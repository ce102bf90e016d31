'use server'
import { redirect } from 'next/navigation'
import { action } from '@/app/action'
import { cancelImport, CancelImport } from '@/lib/use-cases/imports/cancel-import'
import { changeLayout, ChangeLayout } from '@/lib/use-cases/imports/change-layout'
import { confirmImport, ConfirmImport } from '@/lib/use-cases/imports/confirm-import'
import { startCheck, StartCheck } from '@/lib/use-cases/imports/start-check'

const toImport = ({ id }: { id: string }) => redirect(`/imports/${id}`)

export const chooseSheet = action(ChangeLayout, changeLayout, { then: toImport })
export const check = action(StartCheck, startCheck, { then: toImport })
export const confirm = action(ConfirmImport, confirmImport, { then: toImport })
export const cancel = action(CancelImport, cancelImport, { then: () => redirect('/imports') })
