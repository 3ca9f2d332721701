import type { Metadata } from 'next'
import Link from 'next/link'
import { exampleData } from '../data'
import { hasExample, textsFrom } from './fields'
import { WorkedExample } from './worked-example'

export const metadata: Metadata = {
  title: 'A worked example',
  description:
    'Type L*, a* and b* of a page and its ink, or a list of readings, and follow every step to whiteness, tint, contrast, their doubts, and the contrast reserve in a light.',
  alternates: { canonical: '/method/try' },
}

type Search = Promise<Record<string, string | string[] | undefined>>

export default async function TryPage({ searchParams }: { searchParams: Search }) {
  const search = await searchParams
  const address = {
    get: (name: string) => {
      const given = search[name]
      return typeof given === 'string' ? given : null
    },
  }
  const data = await exampleData(address.get('start') ?? undefined)
  return (
    <main className="measure py-12">
      <p className="text-small">
        <Link href="/method" prefetch={false}>
          Method 1
        </Link>{' '}
        / A worked example
      </p>
      <h1 className="mt-3">A worked example</h1>
      <p className="mt-4 max-w-[60ch] text-lead text-soft">
        Change any number and follow every step: from readings to a colour, to whiteness, tint and contrast, to how sure
        that is, and to what it gives in a light.
      </p>
      <h2 className="sr-only">What goes in and what comes out</h2>
      <WorkedExample data={data} texts={hasExample(address) ? textsFrom(address, data.start.texts) : undefined} />
    </main>
  )
}
