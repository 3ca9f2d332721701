import { fileURLToPath } from 'node:url'
import type { NextConfig } from 'next'
import { CATALOGUE_KEYS } from './lib/catalogue/keys'
import { DEFAULT_LOOK, LOOK_COOKIE, LOOKS, lookName } from './lib/look'
import { SECURITY_HEADERS } from './lib/page-policy.mjs'

/** Pages named *.specimen.tsx are for those who build the site; a production build does not contain them. */
const development = process.env.NODE_ENV !== 'production'
const withSpecimen = development || process.env.LAMPLEAF_SPECIMEN === '1'

/** In development React evaluates text, which the policy forbids. */
const securityHeaders = SECURITY_HEADERS.filter(({ key }) => !development || key !== 'Content-Security-Policy')

const anyLook = LOOKS.map(lookName).join('|')
/** Every address of a page: not a file, a machine's address, or one that already names a look. */
const page = `/:path((?!(?:${anyLook}|_next|api|look)(?:/|$))[^.]*)`

/** Where an address with any of these queries is answered: by a page made for the request, not by the stored one. */
function inner(source: string, page: string, keys: readonly string[]) {
  const chosen = { type: 'cookie' as const, key: LOOK_COOKIE, value: `(?<look>${anyLook})` }
  return keys.flatMap((key) => [
    { source, has: [{ type: 'query' as const, key }, chosen], destination: `/:look${page}` },
    { source, has: [{ type: 'query' as const, key }], destination: `/${lookName(DEFAULT_LOOK)}${page}` },
  ])
}

const config: NextConfig = {
  // The browser tests build beside a running site, so each build may have a folder of its own.
  distDir: process.env.NEXT_DIST_DIR ?? '.next',
  pageExtensions: withSpecimen ? ['tsx', 'ts', 'specimen.tsx'] : ['tsx', 'ts'],
  poweredByHeader: false,
  // The front squeezes answers (lib/serving/squeeze.mjs): Brotli, which sees repetitions far apart, beside gzip.
  compress: false,
  reactStrictMode: true,
  // Titles come with the page, for every reader: streamed after it, they arrive late and at the wrong place.
  htmlLimitedBots: /.*/,
  // The image optimizer has had remote code execution advisories, and nothing here needs it.
  images: { unoptimized: true },
  serverExternalPackages: ['postgres', 'piscina'],
  // Finished pages live in the process: on disk they would outlive it, and belong to whichever database it served.
  experimental: { isrFlushToDisk: false },
  cacheMaxMemorySize: 128 * 1024 * 1024,
  cacheHandler: development ? undefined : fileURLToPath(new URL('./lib/page-cache.mjs', import.meta.url)),
  async headers() {
    return [{ source: '/:path*', headers: securityHeaders }]
  },
  async redirects() {
    // The inner addresses are nobody's business but ours.
    return [{ source: `/:look(${anyLook})/:path*`, destination: '/:path*', permanent: false }]
  },
  async rewrites() {
    return {
      beforeFiles: [
        ...inner('/', '/lit', ['lux', 'step']),
        ...inner('/devices', '/devices/found', CATALOGUE_KEYS),
        {
          source: page,
          has: [{ type: 'cookie', key: LOOK_COOKIE, value: `(?<look>${anyLook})` }],
          destination: '/:look/:path',
        },
        { source: page, destination: `/${lookName(DEFAULT_LOOK)}/:path` },
      ],
      afterFiles: [],
      fallback: [{ source: `/:look(${anyLook})/:path*`, destination: '/:look/not-here' }],
    }
  },
}

export default config
