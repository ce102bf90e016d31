/** A part of the town: its edge, when it was built, and how its streets were laid out. Types only. */
import { type Ring } from './ring'
import { type Era, type Frontage } from './street'
import { type STREET_NAMES } from './street-names'

type Names = keyof typeof STREET_NAMES

export type Layout =
  | { readonly by: 'hand'; readonly streets: readonly HandStreet[] }
  | {
      readonly by: 'grid'
      readonly angle: number
      readonly pitch: number
      readonly across: number
      readonly names: Names
    }
  | {
      readonly by: 'crescents'
      readonly centre: readonly [number, number]
      readonly radii: readonly number[]
      readonly avenues: readonly number[]
      readonly closes: Names
    }
  | {
      readonly by: 'closes'
      readonly streets: readonly HandStreet[]
      readonly step: number
      readonly reach: readonly [number, number]
      readonly room: number
      readonly names: Names
    }

export type HandStreet = readonly [
  name: string,
  points: string,
  frontage?: Frontage,
  kind?: 'street' | 'lane' | 'walk',
]

export type District = {
  readonly name: string
  /** where its name is written on the map */
  readonly label: readonly [number, number]
  readonly era: Era
  readonly frontage: Frontage
  readonly ring: Ring
  readonly layout: Layout
}
