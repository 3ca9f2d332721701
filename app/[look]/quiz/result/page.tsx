import { redirect } from 'next/navigation'
import { completeRequest } from '@/lib/contract/complete-request'
import { pairsFrom, readAddress } from '@/lib/quiz/address'
import { resultHref } from '@/lib/quiz/moves'
import { toRequest } from '@/lib/quiz/request'
import type { Result } from '@/lib/quiz/result'
import { latestEdition } from '@/lib/server/editions'
import { type LookParams, requireLook } from '@/lib/server/look'
import { matchOnServer, TooBusy } from '@/lib/server/match'
import { pageMetadata } from '@/lib/server/page-metadata'
import { Answer } from './answer'
import { NothingLeft } from './nothing-left'
import { NothingReadable } from './nothing-readable'
import { Busy, NothingYet } from './unanswered'
import { WrongAddress } from './wrong-address'
import './print.css'

// Each is one reader's own: its address holds their answers, so it has no other.
export const generateMetadata = () =>
  pageMetadata({
    title: 'Your result',
    description: 'The pages that suit your light, in order of fit, with reasons, doubts and what would change it.',
    path: '/quiz/result',
    index: false,
  })

type Search = Record<string, string | string[] | undefined>

type Props = { params: Promise<LookParams>; searchParams: Promise<Search> }

export default async function ResultPage({ params, searchParams }: Props) {
  const { page, ...search } = await searchParams
  const pairs = pairsFrom(search)
  const address = readAddress(pairs)
  if (address.problems.length > 0) return <WrongAddress address={address} />
  const canonical = resultHref(address)
  if (address.unknown.length === 0 && !isWrittenAs(canonical, pairs)) redirect(canonical)

  const edition = await latestEdition()
  if (!edition || edition.devices.length === 0) return <NothingYet />
  const { answers, assumed } = completeRequest(toRequest(address.answers))
  const match = await matchOnServer(edition, answers).catch((cause: unknown) => {
    if (cause instanceof TooBusy) return null
    throw cause
  })
  if (!match) return <Busy href={canonical} />

  const result: Result = { address, answers, assumed, edition, match }
  if (match.ranked.length === 0) return <NothingLeft result={result} />
  if (match.ranked.every(({ unreadable }) => unreadable === 1)) return <NothingReadable result={result} />
  return <Answer result={result} page={pageIn(page)} paper={(await requireLook(params)).theme === 'paper'} />
}

function isWrittenAs(href: string, pairs: [string, string][]): boolean {
  return JSON.stringify(pairs) === JSON.stringify([...new URLSearchParams(href.split('?')[1] ?? '')])
}

/** Which page of the table an address asks for. */
function pageIn(text: string | string[] | undefined): number | 'all' {
  if (text === 'all') return text
  return typeof text === 'string' && /^[1-9]\d{0,3}$/.test(text) ? Number(text) : 1
}
