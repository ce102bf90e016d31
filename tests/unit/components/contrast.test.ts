import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { type ColourToken, THEMES } from '@/tailwind.config'

/**
 * Relative luminance and contrast ratio.
 * @source WCAG 2.2, definitions "relative luminance" and "contrast ratio"
 */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5]
    .map((at) => parseInt(hex.slice(at, at + 2), 16) / 255)
    .map((part) => (part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4))
  return 0.2126 * r + 0.7152 * g + 0.0722 * b
}
function contrast(one: string, other: string): number {
  const [darker = 0, lighter = 0] = [luminance(one), luminance(other)].sort((a, b) => a - b)
  return (lighter + 0.05) / (darker + 0.05)
}

const TEXT: readonly (readonly [ground: ColourToken, ...texts: ColourToken[]])[] = [
  [
    'paper',
    'ink',
    'slate',
    'copper',
    'copper-deep',
    'verdigris',
    'amber',
    'madder',
    'madder-deep',
    'blueprint',
  ],
  [
    'surface',
    'ink',
    'slate',
    'copper',
    'copper-deep',
    'verdigris',
    'amber',
    'madder',
    'madder-deep',
    'blueprint',
  ],
  ['sunken', 'ink', 'slate', 'copper', 'copper-deep'],
  ['copper-wash', 'ink', 'slate', 'copper', 'copper-deep'],
  ['verdigris-wash', 'ink', 'slate', 'verdigris', 'copper'],
  ['amber-wash', 'ink', 'slate', 'amber', 'copper'],
  ['madder-wash', 'ink', 'slate', 'madder', 'copper'],
  ['blueprint-wash', 'ink', 'slate', 'blueprint', 'copper'],
  ['copper', 'on-copper'],
  ['copper-deep', 'on-copper'],
  ['madder', 'on-madder'],
  ['madder-deep', 'on-madder'],
  ['ink', 'paper'],
]

/** Edges of controls, focus rings, and the parts of drawings that carry meaning. */
const SHAPES: readonly (readonly [ground: ColourToken, ...shapes: ColourToken[]])[] = [
  ['paper', 'edge', 'copper', 'verdigris', 'madder', 'blueprint'],
  ['surface', 'edge', 'copper', 'verdigris', 'amber', 'madder', 'blueprint', 'slate'],
  ['sunken', 'edge', 'copper'],
  ['plate', 'copper', 'blueprint', 'madder', 'amber'],
  ['copper-wash', 'copper'],
  ['madder-wash', 'copper', 'madder', 'edge'],
]

const rows = (table: typeof TEXT) =>
  (['light', 'dark'] as const).flatMap((theme) =>
    table.flatMap(([ground, ...others]) => others.map((other) => ({ theme, ground, other }))),
  )
const between = (theme: 'light' | 'dark', one: ColourToken, other: ColourToken) =>
  contrast(THEMES[theme][one], THEMES[theme][other])

describe('the ratio itself', () => {
  it('is 21 between black and white, as WCAG 2.2 states, and the same either way round', () => {
    expect(contrast('#000000', '#FFFFFF')).toBeCloseTo(21, 10)
    expect(contrast('#FFFFFF', '#000000')).toBeCloseTo(21, 10)
  })
  it('puts #767676 on white just above the line of 4.5 and #777777 just below (common practice, from memory)', () => {
    expect(contrast('#767676', '#FFFFFF')).toBeCloseTo(4.54, 2)
    expect(contrast('#777777', '#FFFFFF')).toBeCloseTo(4.48, 2)
  })
})

describe('tokens', () => {
  // WCAG 2.2, success criterion 1.4.3 Contrast (Minimum), level AA
  it.each(rows(TEXT))(
    'text $other on $ground reads at 4.5 to 1 in the $theme theme',
    ({ theme, ground, other }) => {
      expect(between(theme, ground, other)).toBeGreaterThanOrEqual(4.5)
    },
  )

  // WCAG 2.2, success criterion 1.4.11 Non-text Contrast, level AA
  it.each(rows(SHAPES))(
    'shape $other on $ground shows at 3 to 1 in the $theme theme',
    ({ theme, ground, other }) => {
      expect(between(theme, ground, other)).toBeGreaterThanOrEqual(3)
    },
  )
})

const TOKENS = Object.keys(THEMES.light) as ColourToken[]
const tokenAfter = (prefix: string, name: string): ColourToken | undefined =>
  TOKENS.find((token) => name === `${prefix}-${token}`)

const sources = ['app', 'components'].flatMap((folder) =>
  readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((name) => /\.tsx?$/.test(name))
    .map((name) => join(folder, name)),
)

/** Every class list in the program that sets both a ground and a text colour, with the pair it sets. */
function pairsInUse(): { where: string; ground: ColourToken; text: ColourToken }[] {
  return sources.flatMap((file) =>
    [...readFileSync(file, 'utf8').matchAll(/['"`]([^'"`\n]*\bbg-[^'"`\n]*)['"`]/g)].flatMap((match) => {
      const names = (match[1] ?? '').split(/\s+/)
      const grounds = names.flatMap((name) => tokenAfter('bg', name) ?? [])
      const texts = names.flatMap((name) => tokenAfter('text', name) ?? [])
      return grounds.flatMap((ground) => texts.map((text) => ({ where: file, ground, text })))
    }),
  )
}

describe('class lists', () => {
  const pairs = pairsInUse()
  it('are found', () => {
    expect(pairs.length).toBeGreaterThan(20)
  })
  it.each(pairs)('$where: text-$text on bg-$ground reads in both themes', ({ ground, text }) => {
    expect(between('light', ground, text)).toBeGreaterThanOrEqual(4.5)
    expect(between('dark', ground, text)).toBeGreaterThanOrEqual(4.5)
  })
})
