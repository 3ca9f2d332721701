import { OPENING_LUX } from '@/lib/lamp/levels'
import { Home } from './(home)/home'
import { homeMetadata } from './(home)/home-metadata'

export const dynamic = 'force-static'
export const revalidate = 60

export const generateMetadata = () => homeMetadata()

export default function HomePage() {
  return <Home openingLux={OPENING_LUX} />
}
