'use server'
import { publicAction } from '@/app/action'
import { AskForReset, askForReset } from '@/lib/use-cases/people/ask-for-reset'

export const ask = publicAction(AskForReset, askForReset)
