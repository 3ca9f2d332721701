import Link from 'next/link'
import { LampMark } from './lamp-mark'
import { PhoneNavigation, WideNavigation } from './navigation'

export function Masthead() {
  return (
    <header className="relative border-b border-rule bg-sheet paper:border-b-3">
      <div className="measure flex min-h-15.5 items-center gap-7">
        <Link
          prefetch={false}
          href="/"
          className="flex min-h-11 items-center gap-2.5 font-heading text-[1.375rem] font-semibold text-ink no-underline"
        >
          <LampMark />
          Lampleaf
        </Link>
        <WideNavigation />
        <PhoneNavigation />
      </div>
    </header>
  )
}
