'use server'
import { redirect } from 'next/navigation'
import { action } from '@/app/action'
import { changeAccess, ChangeAccess } from '@/lib/use-cases/people/change-access'
import { endAccess, EndAccess } from '@/lib/use-cases/people/end-access'

export const change = action(ChangeAccess, changeAccess, { then: () => redirect('/people') })

export const end = action(EndAccess, endAccess, { then: () => redirect('/people') })
