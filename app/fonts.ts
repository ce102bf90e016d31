import localFont from 'next/font/local'

/**
 * Each face in two files: Latin, and Extended Latin (Welsh ŵ and ŷ, Polish ł) that is fetched only where it is used.
 * The extended one stands first in the family: its range holds no other letter, and so a fallback never steps in.
 * The framework reads these calls before the program runs, so every value is written out.
 */
const text = localFont({
  src: '../node_modules/@fontsource-variable/atkinson-hyperlegible-next/files/atkinson-hyperlegible-next-latin-wght-normal.woff2',
  variable: '--font-text',
  weight: '200 800',
  display: 'swap',
})

const textExtended = localFont({
  src: '../node_modules/@fontsource-variable/atkinson-hyperlegible-next/files/atkinson-hyperlegible-next-latin-ext-wght-normal.woff2',
  variable: '--font-text-ext',
  weight: '200 800',
  display: 'swap',
  preload: false,
  adjustFontFallback: false,
  declarations: [
    {
      prop: 'unicode-range',
      value: 'U+0100-0130, U+0132-0151, U+0154-02BA, U+1E00-1E9F, U+1EF2-1EFF, U+20A0-20AB',
    },
  ],
})

const display = localFont({
  src: '../node_modules/@fontsource-variable/bricolage-grotesque/files/bricolage-grotesque-latin-wght-normal.woff2',
  variable: '--font-display',
  weight: '200 800',
  display: 'swap',
})

const displayExtended = localFont({
  src: '../node_modules/@fontsource-variable/bricolage-grotesque/files/bricolage-grotesque-latin-ext-wght-normal.woff2',
  variable: '--font-display-ext',
  weight: '200 800',
  display: 'swap',
  preload: false,
  adjustFontFallback: false,
  declarations: [
    {
      prop: 'unicode-range',
      value: 'U+0100-0130, U+0132-0151, U+0154-02BA, U+1E00-1E9F, U+1EF2-1EFF, U+20A0-20AB',
    },
  ],
})

const mono = localFont({
  src: '../node_modules/@fontsource-variable/atkinson-hyperlegible-mono/files/atkinson-hyperlegible-mono-latin-wght-normal.woff2',
  variable: '--font-mono',
  weight: '200 800',
  display: 'swap',
  preload: false,
  adjustFontFallback: false,
})

const monoExtended = localFont({
  src: '../node_modules/@fontsource-variable/atkinson-hyperlegible-mono/files/atkinson-hyperlegible-mono-latin-ext-wght-normal.woff2',
  variable: '--font-mono-ext',
  weight: '200 800',
  display: 'swap',
  preload: false,
  adjustFontFallback: false,
  declarations: [
    {
      prop: 'unicode-range',
      value: 'U+0100-0130, U+0132-0151, U+0154-02BA, U+1E00-1E9F, U+1EF2-1EFF, U+20A0-20AB',
    },
  ],
})

/** The class names that define every `--font-*` variable, for the root element. */
export const fontVariables = [text, textExtended, display, displayExtended, mono, monoExtended]
  .map((font) => font.variable)
  .join(' ')
