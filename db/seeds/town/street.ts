/** What stands along a street. Types only. */
import { type RoadClass } from './main-roads'
import { type Line } from './plane'

/** How homes face a street: one building after another, in rows, in pairs, alone, or not at all. */
export type Frontage = 'old' | 'terrace' | 'cottage' | 'semi' | 'estate' | 'detached' | 'bungalow' | 'none'

/** When and how a part of the town was built; it decides what is on the wall of its homes. */
export const ERAS = [
  'medieval',
  'victorian',
  'interwar',
  'postwar',
  'sixties',
  'eighties',
  'millennium',
  'quay',
] as const
export type Era = (typeof ERAS)[number]

export type Street = {
  readonly name: string
  readonly class: RoadClass
  readonly line: Line
  readonly frontage: Frontage
  readonly era: Era
  readonly district: string
}
