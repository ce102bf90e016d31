'use server'
import { action } from '@/app/action'
import { addPatch, AddPatch } from '@/lib/use-cases/organisations/add-patch'
import { changeSettings, ChangeSettings } from '@/lib/use-cases/organisations/change-settings'
import { renamePatch, RenamePatch } from '@/lib/use-cases/organisations/rename-patch'

export const change = action(ChangeSettings, changeSettings, { done: 'Saved.' })

export const add = action(AddPatch, addPatch, { done: ({ name }) => `Added ${name}.` })

export const rename = action(RenamePatch, renamePatch, { done: 'Renamed.' })
