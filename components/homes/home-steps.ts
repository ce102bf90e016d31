import { type HomeRow } from '@/lib/homes/home-row'

export type HomeSteps = readonly { readonly href: string; readonly label: string }[]

/**
 * The way to a home: the list, and the list of its patch.
 * @example stepsTo({ patch: { id: 'p1', name: 'Ferry Bank' } }).map((step) => step.label) // ['Homes', 'Ferry Bank']
 */
export function stepsTo({ patch }: Pick<HomeRow, 'patch'>): HomeSteps {
  const homes = { href: '/homes', label: 'Homes' }
  return patch ? [homes, { href: `/homes?patch=${patch.id}`, label: patch.name }] : [homes]
}
