import type { MetadataRoute } from 'next'

/** The web app manifest (W3C). Colours: the day theme's bench and its deep band. */
export default function manifest(): MetadataRoute.Manifest {
  return {
    id: '/',
    name: 'Lampleaf',
    short_name: 'Lampleaf',
    description: 'Measured pages of electronic-paper reading devices, and a quiz that finds the page for your light.',
    lang: 'en-GB',
    dir: 'ltr',
    start_url: '/',
    scope: '/',
    display: 'browser',
    background_color: '#f4f6f5',
    theme_color: '#0a2f24',
    icons: [
      { src: '/icons/mark.svg', sizes: 'any', type: 'image/svg+xml' },
      { src: '/icons/mark-192.png', sizes: '192x192', type: 'image/png' },
      { src: '/icons/mark-512.png', sizes: '512x512', type: 'image/png' },
      { src: '/icons/mark-maskable-512.png', sizes: '512x512', type: 'image/png', purpose: 'maskable' },
    ],
  }
}
