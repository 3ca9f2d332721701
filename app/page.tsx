import { Notice } from '@/components/ui/notice'
import { lightFrom } from '@/lib/lamp/levels'
import type { LampDevice } from '@/lib/lamp/ranking'
import type { EditionDevice } from '@/lib/method/types'
import { latestEdition } from '@/lib/server/editions'
import { Findings } from './(home)/findings'
import { Hero } from './(home)/hero'
import { LampStage } from './(home)/lamp-stage'
import { SamePage } from './(home)/same-page'

type Search = Promise<Record<string, string | string[] | undefined>>

export default async function HomePage({ searchParams }: { searchParams: Search }) {
  const [edition, search] = await Promise.all([latestEdition(), searchParams])
  return (
    <main>
      <Hero edition={edition}>
        {edition && edition.devices.length > 0 ? (
          <LampStage devices={edition.devices.map(slim)} paper={edition.control.paper} openingLux={lightFrom(search)} />
        ) : (
          <Notice className="self-center">
            No edition has been released yet, so there are no pages to show. The bench is at work; the method is already
            there to read.
          </Notice>
        )}
      </Hero>
      {edition && <Findings edition={edition} />}
      {edition && <SamePage edition={edition} />}
    </main>
  )
}

/** Only what the lamp needs travels to the browser. */
function slim({ slug, name, page, ink, frontLight, diagonal, weight, ppi }: EditionDevice): LampDevice {
  return { slug, name, page, ink, frontLight, diagonal, weight, ppi }
}
