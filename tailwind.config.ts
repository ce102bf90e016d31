import type { Config } from 'tailwindcss'
import plugin from 'tailwindcss/plugin'

/**
 * Every colour of the program, drawn from the material: bright copper and the green that copper turns.
 * A theme is complete, so that one cannot be changed and the other forgotten. Nothing else names a colour.
 * `*-wash` is the ground under a word of that colour; `on-*` is text on that colour as a solid fill.
 */
const light = {
  paper: '#FBF8F3',
  surface: '#FFFFFF',
  sunken: '#F3EEE5',
  ink: '#1D1B20',
  slate: '#5B5F6B',
  line: '#E4DCD0',
  edge: '#857D71',
  plate: '#E4DCD0',
  copper: '#9C4221',
  'copper-deep': '#7A3117',
  'copper-wash': '#F8E9DF',
  'on-copper': '#FFFFFF',
  verdigris: '#1F6F68',
  'verdigris-wash': '#E0F0EE',
  amber: '#8A5A00',
  'amber-wash': '#FFF1D6',
  madder: '#9B1C2E',
  'madder-deep': '#7C1424',
  'madder-wash': '#FCE8EA',
  'on-madder': '#FFFFFF',
  blueprint: '#27476E',
  'blueprint-wash': '#E8EEF6',
} as const

export type ColourToken = keyof typeof light

const dark: Record<ColourToken, string> = {
  paper: '#17161A',
  surface: '#201E23',
  sunken: '#2A272E',
  ink: '#F3EFE8',
  slate: '#B3B0B8',
  line: '#38343E',
  edge: '#85808D',
  plate: '#3B3741',
  copper: '#E39A72',
  'copper-deep': '#EDB394',
  'copper-wash': '#3A2419',
  'on-copper': '#1D1B20',
  verdigris: '#6FC2B6',
  'verdigris-wash': '#15322F',
  amber: '#F0B84B',
  'amber-wash': '#3A2E12',
  madder: '#F08A93',
  'madder-deep': '#F5A9B0',
  'madder-wash': '#3D1A20',
  'on-madder': '#1D1B20',
  blueprint: '#9DBBE0',
  'blueprint-wash': '#1D2938',
}

export const THEMES: { readonly light: Record<ColourToken, string>; readonly dark: typeof dark } = {
  light,
  dark,
}

const TOKENS = Object.keys(light) as ColourToken[]
const asVariables = (theme: Record<ColourToken, string>) =>
  Object.fromEntries(TOKENS.map((token) => [`--${token}`, theme[token]]))

/** The theme follows the system. Paper is white: what is printed uses the light theme whatever the screen shows. */
const themes = plugin(({ addBase }) => {
  addBase({
    ':root': { ...asVariables(light), 'color-scheme': 'light dark' },
    '@media screen and (prefers-color-scheme: dark)': { ':root': asVariables(dark) },
    '@media print': { ':root': { 'color-scheme': 'light' } },
  })
})

const config: Config = {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      ...Object.fromEntries(TOKENS.map((token) => [token, `var(--${token})`])),
    },
    fontFamily: {
      sans: ['var(--font-text-ext)', 'var(--font-text)', 'system-ui', 'sans-serif'],
      display: ['var(--font-display-ext)', 'var(--font-display)', 'system-ui', 'sans-serif'],
      mono: ['var(--font-mono-ext)', 'var(--font-mono)', 'ui-monospace', 'monospace'],
    },
    borderRadius: { none: '0', plate: '0.1875rem', control: '0.375rem', full: '9999px' },
    extend: {
      maxWidth: { page: '90rem', reading: '42rem' },
      minHeight: { target: '1.5rem', control: '2.5rem', thumb: '3rem' },
      minWidth: { target: '1.5rem' },
      fontSize: {
        xs: ['0.8125rem', { lineHeight: '1.125rem' }],
        sm: ['0.9375rem', { lineHeight: '1.375rem' }],
        base: ['1rem', { lineHeight: '1.5rem' }],
        lg: ['1.125rem', { lineHeight: '1.625rem' }],
        xl: ['1.3125rem', { lineHeight: '1.75rem' }],
        '2xl': ['1.625rem', { lineHeight: '2rem' }],
        '3xl': ['2.125rem', { lineHeight: '2.375rem' }],
        '4xl': ['2.75rem', { lineHeight: '2.875rem' }],
        hero: ['clamp(2.5rem, 1.4rem + 4.6vw, 5rem)', { lineHeight: '1' }],
      },
    },
  },
  plugins: [themes],
}

export default config
