import { lightFrom } from '@/lib/lamp/levels'
import { Home } from '../(home)/home'
import { homeMetadata } from '../(home)/home-metadata'

type Props = { searchParams: Promise<Record<string, string | string[] | undefined>> }

export const generateMetadata = () => homeMetadata({ index: false })

/** The home page in a light its address asks for: what the lamp shows without JavaScript. */
export default async function LitHomePage({ searchParams }: Props) {
  return <Home openingLux={lightFrom(await searchParams)} />
}
