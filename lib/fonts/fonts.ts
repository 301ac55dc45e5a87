// The typefaces, shipped with the application. One class name for <html> carries them all as CSS variables; app/globals.css
// puts them in order. Every option is a literal because the framework reads this file without running it.
import localFont from 'next/font/local'

// Atkinson's zero is slashed and cannot be changed, and #30 must not read as #38: in running text the digits and # come from
// B612, drawn a little smaller so that they match. It stands before Atkinson, so it may bring no fallback face of its own.
const digits = localFont({
  src: [
    { path: './b612-latin-400-normal.woff2', weight: '400', style: 'normal' },
    { path: './b612-latin-700-normal.woff2', weight: '700', style: 'normal' },
  ],
  variable: '--font-digits',
  display: 'swap',
  adjustFontFallback: false,
  declarations: [
    { prop: 'unicode-range', value: 'U+23, U+30-39' },
    { prop: 'size-adjust', value: '92%' },
  ],
})

const text = localFont({
  src: './atkinson-hyperlegible-next-latin-wght-normal.woff2',
  variable: '--font-atkinson',
  weight: '200 800',
  display: 'swap',
  adjustFontFallback: 'Arial',
})

// Italics and accented letters beyond Latin-1 are fetched only by pages that need them.
const textItalic = localFont({
  src: './atkinson-hyperlegible-next-latin-wght-italic.woff2',
  variable: '--font-atkinson-italic',
  weight: '200 800',
  style: 'italic',
  display: 'swap',
  preload: false,
  adjustFontFallback: false,
})

const textExtended = localFont({
  src: './atkinson-hyperlegible-next-latin-ext-wght-normal.woff2',
  variable: '--font-atkinson-extended',
  weight: '200 800',
  display: 'swap',
  preload: false,
  adjustFontFallback: false,
  declarations: [{ prop: 'unicode-range', value: 'U+0100-02BA, U+02BD-02C5, U+02C7-02CC, U+02CE-02D7, U+02DD-02FF, U+1E00-1E9F, U+1EF2-1EFF, U+20A0-20AB, U+20AD-20C0' }],
})

const sign = localFont({
  src: './barlow-condensed-latin-600-normal.woff2',
  variable: '--font-barlow',
  weight: '600',
  display: 'swap',
  adjustFontFallback: false,
})

const signExtended = localFont({
  src: './barlow-condensed-latin-ext-600-normal.woff2',
  variable: '--font-barlow-extended',
  weight: '600',
  display: 'swap',
  preload: false,
  adjustFontFallback: false,
  declarations: [{ prop: 'unicode-range', value: 'U+0100-02BA, U+02BD-02C5, U+02C7-02CC, U+02CE-02D7, U+02DD-02FF, U+1E00-1E9F, U+1EF2-1EFF, U+20A0-20AB, U+20AD-20C0' }],
})

// Sizes that stand alone, designations and part codes. Preloaded like the digits because only then do both share one file.
const gauge = localFont({
  src: [
    { path: './b612-latin-400-normal.woff2', weight: '400', style: 'normal' },
    { path: './b612-latin-700-normal.woff2', weight: '700', style: 'normal' },
  ],
  variable: '--font-b612',
  display: 'swap',
  adjustFontFallback: false,
})

/** Class names for `<html>`: each sets one of the CSS variables that app/globals.css builds `--font-text`, `--font-sign` and `--font-gauge` from. */
export const fontClassNames = [digits, text, textItalic, textExtended, sign, signExtended, gauge].map((face) => face.variable).join(' ')
