import { Notice } from '@/components/ui/notice'
import { LAST_STEP, luxAt, OPENING_LUX, parseLux } from '@/lib/lamp/levels'
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
          <LampStage devices={edition.devices.map(slim)} paper={edition.control.paper} openingLux={lightOf(search)} />
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

/** The light an address asks for, by lux or by the slider's step; a bedside lamp where it asks for none we understand. */
function lightOf({ lux, step }: Awaited<Search>): number {
  const asked = typeof lux === 'string' ? parseLux(lux) : null
  if (asked !== null) return asked
  return typeof step === 'string' && /^\d{1,3}$/.test(step) ? luxAt(Math.min(Number(step), LAST_STEP)) : OPENING_LUX
}

/** Only what the lamp needs travels to the browser. */
function slim({ slug, name, page, ink, frontLight, diagonal, weight, ppi }: EditionDevice): LampDevice {
  return { slug, name, page, ink, frontLight, diagonal, weight, ppi }
}
