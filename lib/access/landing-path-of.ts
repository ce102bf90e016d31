import { type Actor } from './actor'

/**
 * Where somebody begins after signing in.
 * @example landingPathOf({ ...electrician }) // '/visits'
 */
export const landingPathOf = (actor: Pick<Actor, 'role'>): '/visits' | '/today' =>
  actor.role === 'supervisor' || actor.role === 'electrician' ? '/visits' : '/today'
