import type { Metadata, Viewport } from 'next'
import type { ReactNode } from 'react'
import { Footer } from '@/components/site/footer'
import { Masthead } from '@/components/site/masthead'
import { config } from '@/lib/server/config'
import { type LookParams, requireLook } from '@/lib/server/look'
import { fontVariables } from '../fonts'
import '../globals.css'

/** Nothing is made at build time: the site's own address and its database are known to a running process alone. */
export async function generateMetadata(): Promise<Metadata> {
  return {
    metadataBase: new URL(config().baseUrl),
    title: { default: 'Lampleaf: find the page that suits your light', template: '%s · Lampleaf' },
    description:
      'How light, how white and how tinted the pages of electronic-paper reading devices are, measured, each figure with its doubt, and a quiz that finds the page for the light you read in.',
  }
}

export const viewport: Viewport = { width: 'device-width', initialScale: 1 }

type Props = { children: ReactNode; params: Promise<LookParams> }

export default async function RootLayout({ children, params }: Props) {
  const look = await requireLook(params)
  return (
    <html lang="en-GB" data-theme={look.theme ?? undefined} className={fontVariables}>
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
