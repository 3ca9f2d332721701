import 'server-only'
import { notFound } from 'next/navigation'
import { cache } from 'react'
import { listCorrectionsRightIn, listCorrectionsWrongIn } from '@/db/queries/corrections'
import { findEditionWords, findLatestEditionNumber } from '@/db/queries/editions'
import { editionChanges } from '@/lib/edition/changes'
import { hasMoved, rankMoves } from '@/lib/edition/changes-ranks'
import { editionNumber } from '@/lib/edition/number'
import { DEFAULT_ANSWERS } from '@/lib/method/spots'
import type { Edition } from '@/lib/method/types'
import { read } from '@/lib/server/db'
import { editionByNumber } from '@/lib/server/editions'
import { matchOnServer } from '@/lib/server/match'

export type Changelog = Awaited<ReturnType<typeof requireChangelog>>

/**
 * A released edition and all that sets it apart from the one before, worked out from the two frozen documents and the
 * corrections. Leaves with 404 where an address names no edition. Cached by the text, so that a page and its metadata
 * share it.
 */
export const requireChangelog = cache(async (text: string) => {
  const number = editionNumber(text)
  const edition = number === null ? null : await editionByNumber(number)
  if (!edition) notFound()
  const [previous, words, latest, corrected, wrong] = await Promise.all([
    edition.number > 1 ? editionByNumber(edition.number - 1) : null,
    read((db) => findEditionWords(db, edition.number)),
    read(findLatestEditionNumber),
    read((db) => listCorrectionsRightIn(db, edition.number)),
    read((db) => listCorrectionsWrongIn(db, edition.number)),
  ])
  return {
    edition,
    previous,
    title: words?.title ?? `Edition ${edition.number}`,
    note: words?.note ?? '',
    /** Number of the newest edition. */
    latest: latest ?? edition.number,
    corrected,
    /** Corrections of what this edition prints; it keeps its figures all the same. */
    wrong,
    changes: previous ? editionChanges(previous, edition) : null,
    moves: previous ? await movesBetween(previous, edition) : [],
  }
})

/** Who moved in the ranking of a reader who answers nothing, in the newer order. */
async function movesBetween(previous: Edition, edition: Edition) {
  const [before, after] = await Promise.all([
    matchOnServer(previous, DEFAULT_ANSWERS),
    matchOnServer(edition, DEFAULT_ANSWERS),
  ])
  return rankMoves(before.ranked, after.ranked).filter(hasMoved)
}

/** The name of a device in either edition, the newer first. */
export function namesIn({ edition, previous }: Pick<Changelog, 'edition' | 'previous'>): (slug: string) => string {
  const names = new Map([...(previous?.devices ?? []), ...edition.devices].map(({ slug, name }) => [slug, name]))
  return (slug) => names.get(slug) ?? slug
}
