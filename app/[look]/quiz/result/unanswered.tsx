import Link from 'next/link'
import { Notice } from '@/components/ui/notice'

/** Before the first release there is nothing to rank. */
export function NothingYet() {
  return (
    <main className="measure py-12">
      <h1>Your result</h1>
      <Notice className="mt-6 max-w-[60ch]">
        No edition has been released yet, so there is nothing to rank your answers against. Your answers are in this
        page’s address: keep it, and it will show your result as soon as there is one.{' '}
        <Link href="/method">How we will judge the pages</Link> is already there to read.
      </Notice>
    </main>
  )
}

/** Too many rankings wait already. */
export function Busy({ href }: { href: string }) {
  return (
    <main className="measure py-12">
      <h1>Your result</h1>
      <Notice look="warning" className="mt-6 max-w-[60ch]">
        Many results are being worked out at this moment. Nothing is lost: your answers are in this page’s address.{' '}
        <a href={href}>Try again in some seconds</a>
      </Notice>
    </main>
  )
}
