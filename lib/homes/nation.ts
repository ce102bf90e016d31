/** The nation whose law governs a home. It is never derived from a postcode: some areas straddle a border. */
export const NATIONS = ['england', 'wales', 'scotland', 'northern-ireland'] as const
export type Nation = (typeof NATIONS)[number]

export const NATION_NAMES: Record<Nation, string> = {
  england: 'England',
  wales: 'Wales',
  scotland: 'Scotland',
  'northern-ireland': 'Northern Ireland',
}
