import type { NextConfig } from 'next'

/** Pages named *.specimen.tsx are for those who build the site; a production build does not contain them. */
const withSpecimen = process.env.NODE_ENV !== 'production' || process.env.LAMPLEAF_SPECIMEN === '1'

/** Headers every answer carries. The tight script policy is not among them yet. */
const securityHeaders = [
  { key: 'X-Content-Type-Options', value: 'nosniff' },
  { key: 'Referrer-Policy', value: 'strict-origin-when-cross-origin' },
  { key: 'X-Frame-Options', value: 'DENY' },
  { key: 'Permissions-Policy', value: 'camera=(), microphone=(), geolocation=(), payment=()' },
]

const config: NextConfig = {
  // The browser tests build beside a running site, so each build may have a folder of its own.
  distDir: process.env.NEXT_DIST_DIR ?? '.next',
  pageExtensions: withSpecimen ? ['tsx', 'ts', 'specimen.tsx'] : ['tsx', 'ts'],
  poweredByHeader: false,
  reactStrictMode: true,
  // Titles come with the page, for every reader: streamed after it, they arrive late and at the wrong place.
  htmlLimitedBots: /.*/,
  // The image optimizer has had remote code execution advisories, and nothing here needs it.
  images: { unoptimized: true },
  serverExternalPackages: ['postgres', 'piscina'],
  async headers() {
    return [{ source: '/:path*', headers: securityHeaders }]
  },
}

export default config
