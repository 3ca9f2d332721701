import { completeRequest } from '@/lib/contract/complete-request'
import { limitWarnings } from '@/lib/method/limits'
import { rankByFit } from '@/lib/method/ranking'
import type { Edition, EditionDevice } from '@/lib/method/types'
import type { QuizAnswers } from './answers'
import { type Assumptions, assumptionsOf } from './assumptions'
import { whyExcluded } from './limit-words'
import { toRequest } from './request'

type Named = { slug: string; name: string }

/** The ranking so far as the quiz shows it beside its steps, by point values alone. */
export type ShortlistView = {
  /** Readable somewhere, in order of fit. */
  rows: (Named & { fit: number })[]
  /** Left by the limits, but not to be read in any of the reader's spots. */
  unreadable: Named[]
  excluded: (Named & { why: string })[]
  /** Devices the limits leave, and all there are. */
  left: number
  of: number
  warnings: ReturnType<typeof limitWarnings>
  assumptions: Assumptions
}

export function shortlistOf(edition: Edition, quiz: QuizAnswers): ShortlistView {
  const { answers, assumed } = completeRequest(toRequest(quiz))
  const { ranked, excluded } = rankByFit(edition, answers)
  const devices = new Map(edition.devices.map((device) => [device.slug, device]))
  const named = ({ slug }: { slug: string }) => ({ slug, name: devices.get(slug)!.name })
  const device = (slug: string): EditionDevice => devices.get(slug)!
  return {
    rows: ranked.filter(({ unreadable }) => unreadable < 1).map((row) => ({ ...named(row), fit: row.fit })),
    unreadable: ranked.filter(({ unreadable }) => unreadable === 1).map(named),
    excluded: excluded.map(({ slug, failed }) => ({
      ...named({ slug }),
      why: whyExcluded(failed, device(slug), answers.limits),
    })),
    left: ranked.length,
    of: edition.devices.length,
    warnings: limitWarnings(answers.limits, ranked.length),
    assumptions: assumptionsOf(assumed, quiz),
  }
}

/** Every file format some device of the edition opens, in capitals and in order. */
export function formatsIn(edition: Edition): string[] {
  const formats = edition.devices.flatMap((device) => device.formats ?? []).map((format) => format.toUpperCase())
  return [...new Set(formats)].sort()
}
