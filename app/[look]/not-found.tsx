import type { Metadata } from 'next'
import { ButtonLink } from '@/components/ui/button'

export const metadata: Metadata = { title: 'Not found' }

export default function NotFound() {
  return (
    <main className="measure py-16">
      <h1>There is no page at this address</h1>
      <p className="mt-4 max-w-prose text-lead text-soft">
        It may have been mistyped, or the device may have changed its name. Nothing you entered is lost.
      </p>
      <div className="mt-8 flex flex-wrap gap-3">
        <ButtonLink href="/devices">See every device</ButtonLink>
        <ButtonLink href="/quiz" look="quiet">
          Take the quiz
        </ButtonLink>
      </div>
    </main>
  )
}
