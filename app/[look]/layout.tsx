import type { Metadata, Viewport } from 'next'
import type { ReactNode } from 'react'
import { Footer } from '@/components/site/footer'
import { Masthead } from '@/components/site/masthead'
import { config } from '@/lib/server/config'
import { latestEdition } from '@/lib/server/editions'
import { type LookParams, requireLook } from '@/lib/server/look'
import { openGraphFor } from '@/lib/server/page-metadata'
import { fontVariables } from '../fonts'
import '../globals.css'
import { HOME_DESCRIPTION } from './(home)/home-metadata'

/** Nothing is made at build time: the site's own address and its database are known to a running process alone. */
export async function generateMetadata(): Promise<Metadata> {
  return {
    metadataBase: new URL(config().baseUrl),
    title: { default: 'Lampleaf: find the page that suits your light', template: '%s · Lampleaf' },
    description: HOME_DESCRIPTION,
    // A page without a picture of its own shows the site's.
    openGraph: openGraphFor('/', await latestEdition()),
    twitter: { card: 'summary_large_image' },
  }
}

/** Where the news can be followed, in the two forms readers of feeds know. */
const FEEDS = [
  { type: 'application/atom+xml', href: '/feed.xml' },
  { type: 'application/feed+json', href: '/feed.json' },
]

export const viewport: Viewport = { width: 'device-width', initialScale: 1 }

type Props = { children: ReactNode; params: Promise<LookParams> }

export default async function RootLayout({ children, params }: Props) {
  const look = await requireLook(params)
  return (
    <html lang="en-GB" data-theme={look.theme ?? undefined} className={fontVariables}>
      <head>
        {FEEDS.map(({ type, href }) => (
          <link
            key={href}
            rel="alternate"
            type={type}
            href={href}
            title="Lampleaf: editions, corrections and new devices"
          />
        ))}
      </head>
      <body className="flex min-h-dvh flex-col">
        <a
          href="#content"
          className="sr-only focus:not-sr-only focus:absolute focus:top-2 focus:left-2 focus:z-30 focus:bg-sheet focus:px-4 focus:py-3 focus:font-semibold"
        >
          Skip to the content
        </a>
        <Masthead />
        <div id="content" tabIndex={-1} className="flex-1">
          {children}
        </div>
        <Footer look={look} />
      </body>
    </html>
  )
}
