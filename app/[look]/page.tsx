import type { Metadata } from 'next'
import { OPENING_LUX } from '@/lib/lamp/levels'
import { Home } from './(home)/home'

export const dynamic = 'force-static'
export const revalidate = 60

export const metadata: Metadata = { alternates: { canonical: '/' } }

export default function HomePage() {
  return <Home openingLux={OPENING_LUX} />
}
