import { fileURLToPath } from 'node:url'

/** A Next.js application of the site's own versions with nothing in it: what `npm run bench:web` measures beside. */
export default {
  distDir: '.next-bare',
  poweredByHeader: false,
  reactStrictMode: true,
  htmlLimitedBots: /.*/,
  images: { unoptimized: true },
  // The packages are the site's, two folders up.
  turbopack: { root: fileURLToPath(new URL('../../..', import.meta.url)) },
}
