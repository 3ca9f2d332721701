import type { Metadata } from 'next'
import Link from 'next/link'
import { redirect } from 'next/navigation'
import { Notice } from '@/components/ui/notice'
import { type Address, pairsFrom, readAddress } from '@/lib/quiz/address'
import { hrefAfter, problemsIn, quizHref, stepIn, targetIn, withLux } from '@/lib/quiz/moves'
import { formatsIn, shortlistOf } from '@/lib/quiz/shortlist'
import { stepTitle } from '@/lib/quiz/steps'
import { plainNumber } from '@/lib/quiz/values'
import { latestEdition } from '@/lib/server/editions'
import { pageMetadata } from '@/lib/server/page-metadata'
import { QuizRoom } from './quiz-room'

type Search = Record<string, string | string[] | undefined>
type Props = { searchParams: Promise<Search> }

export async function generateMetadata({ searchParams }: Props): Promise<Metadata> {
  const search = await searchParams
  const step = stepIn(one(search.step))
  const wrong = problemsIn(step, readAddress(pairsFrom(search))).length > 0
  return pageMetadata({
    title: stepTitle(step, wrong),
    description:
      'Five steps: what you read, where, by how much light, and what matters to you. Every step can be skipped.',
    path: '/quiz',
  })
}

export default async function QuizPage({ searchParams }: Props) {
  const search = await searchParams
  const address = readAddress(pairsFrom(search))
  const elsewhere = hrefElsewhere(search, address)
  if (elsewhere) redirect(elsewhere)

  const edition = await latestEdition()
  if (!edition || edition.devices.length === 0) return <NothingYet />
  return <QuizRoom initial={shortlistOf(edition, address.answers)} formats={formatsIn(edition)} />
}

/**
 * Where a form without JavaScript leads, or the canonical address where this one is another way of writing it; null
 * where this page is the right one.
 */
function hrefElsewhere(search: Search, address: Address): string | null {
  const step = stepIn(one(search.step))
  const target = targetIn(one(search.estimate))
  const lux = plainNumber(one(search.use) ?? '')
  if (lux !== undefined && target) return quizHref(2, withLux(target, lux, address))
  const go = one(search.go)
  if (go !== undefined) return hrefAfter(go, step, address)
  if (target || address.problems.length > 0) return null
  const canonical = quizHref(step, address)
  return sameAddress(search, canonical) ? null : canonical
}

function sameAddress(search: Search, href: string): boolean {
  const canonical = [...new URLSearchParams(href.split('?')[1] ?? '')]
  return JSON.stringify(pairsFrom(search)) === JSON.stringify(canonical)
}

function one(value: string | string[] | undefined): string | undefined {
  return Array.isArray(value) ? value[0] : value
}

function NothingYet() {
  return (
    <main className="measure py-12">
      <h1>The quiz</h1>
      <Notice className="mt-6 max-w-[60ch]">
        No edition has been released yet, so there is nothing to rank your answers against. The bench is at work;{' '}
        <Link href="/method">how we will judge the pages</Link> is already there to read.
      </Notice>
    </main>
  )
}
