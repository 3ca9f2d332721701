import { JsonLd } from '@/components/json-ld'
import { Notice } from '@/components/ui/notice'
import type { LampDevice } from '@/lib/lamp/ranking'
import type { EditionDevice } from '@/lib/method/types'
import { latestEdition } from '@/lib/server/editions'
import { siteUrl } from '@/lib/server/site-url'
import { websiteStructuredData } from '@/lib/structured/website'
import { Findings } from './findings'
import { Hero } from './hero'
import { HOME_DESCRIPTION } from './home-metadata'
import { LampStage } from './lamp-stage'
import { SamePage } from './same-page'
import { TypicalReaders } from './typical-readers'

/** The home page in one light, lux on the page. */
export async function Home({ openingLux }: { openingLux: number }) {
  const edition = await latestEdition()
  return (
    <main>
      <JsonLd data={websiteStructuredData(HOME_DESCRIPTION, siteUrl)} />
      <Hero edition={edition}>
        {edition && edition.devices.length > 0 ? (
          <LampStage devices={edition.devices.map(slim)} paper={edition.control.paper} openingLux={openingLux} />
        ) : (
          <Notice className="self-center">
            No edition has been released yet, so there are no pages to show. The bench is at work; the method is already
            there to read.
          </Notice>
        )}
      </Hero>
      {edition && <Findings edition={edition} />}
      <TypicalReaders />
      {edition && <SamePage edition={edition} />}
    </main>
  )
}

/** Only what the lamp needs travels to the browser. */
function slim({ slug, name, page, ink, frontLight, diagonal, weight, ppi }: EditionDevice): LampDevice {
  return { slug, name, page, ink, frontLight, diagonal, weight, ppi }
}
