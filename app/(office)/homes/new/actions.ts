'use server'
import { redirect } from 'next/navigation'
import { action } from '@/app/action'
import { addHome, AddHome } from '@/lib/use-cases/homes/add-home'
import { homeSaying } from '../[homeId]/said'

export const add = action(AddHome, addHome, {
  then: ({ homeId }: { homeId: string }) => redirect(homeSaying(homeId, 'added')),
})
