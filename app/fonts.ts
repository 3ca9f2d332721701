import localFont from 'next/font/local'

// Each family comes in four files: Latin and extended Latin, upright and italic. The four share one family name, so
// the browser takes a file only for the letters that need it, and only what every page shows is preloaded. Next reads
// these calls before the code runs, so every argument is spelt out. Unicode ranges: those the files were cut to.

const petrona = localFont({
  src: '../public/fonts/petrona-latin-wght-normal.woff2',
  weight: '100 900',
  style: 'normal',
  variable: '--family-heading',
  fallback: ['Georgia', 'serif'],
  adjustFontFallback: 'Times New Roman',
  declarations: [
    { prop: 'font-family', value: 'petrona' },
    {
      prop: 'unicode-range',
      value:
        'U+0000-00FF, U+0131, U+0152-0153, U+02BB-02BC, U+02C6, U+02DA, U+02DC, U+0304, U+0308, U+0329, U+2000-206F, U+20AC, U+2122, U+2191, U+2193, U+2212, U+2215, U+FEFF, U+FFFD',
    },
  ],
})

const petronaItalic = localFont({
  src: '../public/fonts/petrona-latin-wght-italic.woff2',
  weight: '100 900',
  style: 'italic',
  preload: false,
  variable: '--family-heading-italic',
  adjustFontFallback: false,
  declarations: [
    { prop: 'font-family', value: 'petrona' },
    {
      prop: 'unicode-range',
      value:
        'U+0000-00FF, U+0131, U+0152-0153, U+02BB-02BC, U+02C6, U+02DA, U+02DC, U+0304, U+0308, U+0329, U+2000-206F, U+20AC, U+2122, U+2191, U+2193, U+2212, U+2215, U+FEFF, U+FFFD',
    },
  ],
})

const petronaExtended = localFont({
  src: [
    { path: '../public/fonts/petrona-latin-ext-wght-normal.woff2', weight: '100 900', style: 'normal' },
    { path: '../public/fonts/petrona-latin-ext-wght-italic.woff2', weight: '100 900', style: 'italic' },
  ],
  preload: false,
  variable: '--family-heading-extended',
  adjustFontFallback: false,
  declarations: [
    { prop: 'font-family', value: 'petrona' },
    {
      prop: 'unicode-range',
      value:
        'U+0100-02BA, U+02BD-02C5, U+02C7-02CC, U+02CE-02D7, U+02DD-02FF, U+0304, U+0308, U+0329, U+1D00-1DBF, U+1E00-1E9F, U+1EF2-1EFF, U+2020, U+20A0-20AB, U+20AD-20C0, U+2113, U+2C60-2C7F, U+A720-A7FF',
    },
  ],
})

const atkinson = localFont({
  src: '../public/fonts/atkinson-hyperlegible-next-latin-wght-normal.woff2',
  weight: '200 800',
  style: 'normal',
  variable: '--family-text',
  fallback: ['Verdana', 'sans-serif'],
  adjustFontFallback: 'Arial',
  declarations: [
    { prop: 'font-family', value: 'atkinson' },
    {
      prop: 'unicode-range',
      value:
        'U+0000-00FF, U+0131, U+0152-0153, U+02BB-02BC, U+02C6, U+02DA, U+02DC, U+0304, U+0308, U+0329, U+2000-206F, U+20AC, U+2122, U+2191, U+2193, U+2212, U+2215, U+FEFF, U+FFFD',
    },
  ],
})

const atkinsonItalic = localFont({
  src: '../public/fonts/atkinson-hyperlegible-next-latin-wght-italic.woff2',
  weight: '200 800',
  style: 'italic',
  preload: false,
  variable: '--family-text-italic',
  adjustFontFallback: false,
  declarations: [
    { prop: 'font-family', value: 'atkinson' },
    {
      prop: 'unicode-range',
      value:
        'U+0000-00FF, U+0131, U+0152-0153, U+02BB-02BC, U+02C6, U+02DA, U+02DC, U+0304, U+0308, U+0329, U+2000-206F, U+20AC, U+2122, U+2191, U+2193, U+2212, U+2215, U+FEFF, U+FFFD',
    },
  ],
})

const atkinsonExtended = localFont({
  src: [
    {
      path: '../public/fonts/atkinson-hyperlegible-next-latin-ext-wght-normal.woff2',
      weight: '200 800',
      style: 'normal',
    },
    {
      path: '../public/fonts/atkinson-hyperlegible-next-latin-ext-wght-italic.woff2',
      weight: '200 800',
      style: 'italic',
    },
  ],
  preload: false,
  variable: '--family-text-extended',
  adjustFontFallback: false,
  declarations: [
    { prop: 'font-family', value: 'atkinson' },
    {
      prop: 'unicode-range',
      value:
        'U+0100-02BA, U+02BD-02C5, U+02C7-02CC, U+02CE-02D7, U+02DD-02FF, U+0304, U+0308, U+0329, U+1D00-1DBF, U+1E00-1E9F, U+1EF2-1EFF, U+2020, U+20A0-20AB, U+20AD-20C0, U+2113, U+2C60-2C7F, U+A720-A7FF',
    },
  ],
})

/** Classes for the root element: they define `--family-heading` and `--family-text`, and bring the files along. */
export const fontVariables = [petrona, petronaItalic, petronaExtended, atkinson, atkinsonItalic, atkinsonExtended]
  .map((font) => font.variable)
  .join(' ')
