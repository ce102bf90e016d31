'use server'
import { publicAction } from '@/app/action'
import { signUp, SignUp } from '@/lib/use-cases/organisations/sign-up'

export const begin = publicAction(SignUp, signUp)
