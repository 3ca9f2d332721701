import 'server-only'
import { LRUCache } from 'lru-cache'
import type { Edition } from '@/lib/method/types'
import type { Subject } from '@/lib/og/address'
import { compose } from '@/lib/og/compose'
import { drawPicture } from '@/lib/og/draw'

/** Bytes kept of pictures already drawn; one has about 40,000. House. */
const MOST_BYTES = 12_000_000

const drawn = new LRUCache<string, Uint8Array<ArrayBuffer>>({
  maxSize: MOST_BYTES,
  sizeCalculation: (png) => png.byteLength,
})
/** Pictures being drawn: who asks for one of them waits for the same. */
const drawing = new Map<string, Promise<Uint8Array<ArrayBuffer>>>()
/** Drawing takes the whole processor for a moment, so pictures are drawn one after the other. */
let last: Promise<unknown> = Promise.resolve()

/** The picture of a subject in a released edition, as PNG; null: there is nothing to draw. */
export async function pictureOf(edition: Edition, subject: Subject): Promise<Uint8Array<ArrayBuffer> | null> {
  const picture = compose(edition, subject)
  if (!picture) return null
  const name = JSON.stringify([edition.number, subject])
  const known = drawn.get(name)
  if (known) return known
  let work = drawing.get(name)
  if (!work) {
    work = last.then(() => drawPicture(picture))
    drawing.set(name, work)
    last = work.catch(() => {})
    work.then((png) => drawn.set(name, png)).catch(() => {})
    work.finally(() => drawing.delete(name)).catch(() => {})
  }
  return work
}
