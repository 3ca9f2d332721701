import Link from 'next/link'
import { Notice } from '@/components/ui/notice'
import { type Choice, MOST_COMPARED } from '@/lib/compare/address'
import { formatList } from '@/lib/format/list'
import type { EditionDevice } from '@/lib/method/types'

/** What of an address could not be shown as asked, and what to do about it. Nothing where all is well. */
export function ChoiceNotices({ choice, edition }: { choice: Choice<EditionDevice>; edition: number }) {
  const { chosen, left, twice, unknown } = choice
  const names = (devices: readonly EditionDevice[]) => formatList(devices.map(({ name }) => name))
  const words = [
    unknown.length > 0 &&
      `Edition ${edition} has no device at ${formatList(unknown.map((slug) => `“${slug}”`))}; ${unknown.length === 1 ? 'it is' : 'they are'} left out.`,
    twice.length > 0 &&
      `${names(twice)} ${twice.length === 1 ? 'was' : 'were'} named twice and ${twice.length === 1 ? 'is' : 'are'} shown once.`,
    left.length > 0 &&
      `No more than ${MOST_COMPARED} pages can be told apart at once, so ${names(left)} ${left.length === 1 ? 'is' : 'are'} left out. Choose below which to see.`,
  ].filter((sentence) => sentence !== false)
  return (
    <>
      {words.length > 0 && (
        <Notice look="warning" role="status" className="mt-6 grid max-w-[68ch] gap-2">
          {words.map((sentence) => (
            <p key={sentence} className="wrap-anywhere">
              {sentence}
            </p>
          ))}
        </Notice>
      )}
      {chosen.length < 2 && (
        <p className="mt-4 max-w-[62ch] text-lead text-soft">
          {chosen.length === 1
            ? `${names(chosen)} is chosen; choose at least one more to see the pages side by side.`
            : 'Choose two to four devices to see their pages side by side, and what sets them apart.'}{' '}
          They can also be ticked in the{' '}
          <Link href="/devices" prefetch={false}>
            list of devices
          </Link>
          .
        </p>
      )}
    </>
  )
}
