import type { Metadata } from 'next'
import Link from 'next/link'
import { OPENAPI } from '@/lib/openapi/document'
import { fieldsOf } from '@/lib/openapi/fields'
import { SCHEMAS } from '@/lib/openapi/schemas'
import { siteUrl } from '@/lib/server/site-url'
import { OperationSection } from './operation'

export const dynamic = 'force-static'
export const revalidate = 60

export const metadata: Metadata = {
  title: 'API',
  description:
    'Ask for editions, devices, figures, readings and rankings as JSON: every address, parameter and field, with an example of each that works. No key, no account.',
  alternates: { canonical: '/data/api' },
}

const OPERATIONS = Object.entries(OPENAPI.paths).flatMap(([path, { get, post }]) => [
  ...(get ? [{ path, method: 'GET' as const, operation: get }] : []),
  ...(post ? [{ path, method: 'POST' as const, operation: post }] : []),
])

export default function ApiPage() {
  const origin = siteUrl('/')
  return (
    <main className="measure py-12 [&_code]:font-text [&_pre]:font-text">
      <h1>The API</h1>
      <p className="mt-4 max-w-[60ch] text-lead text-soft">
        The same figures the pages show, as JSON. No key and no account; the data are under {OPENAPI.info.license.name}.
      </p>
      <p className="mt-4 flex flex-wrap gap-x-6 gap-y-1">
        <a href="/api/v1/openapi.json" className="inline-flex min-h-11 items-center">
          OpenAPI 3.1 description
        </a>
        <Link prefetch={false} href="/data" className="inline-flex min-h-11 items-center">
          The same data as files
        </Link>
      </p>
      <nav aria-label="Addresses of the API" className="mt-4">
        <ul className="grid md:grid-cols-2">
          {OPERATIONS.map(({ operation: { operationId, summary } }) => (
            <li key={operationId}>
              <a href={`#${operationId}`} className="inline-flex min-h-11 items-center md:min-h-8">
                {summary}
              </a>
            </li>
          ))}
        </ul>
      </nav>
      <section aria-labelledby="manners-title" className="mt-10">
        <h2 id="manners-title">What holds for all of it</h2>
        <ul className="mt-4 grid max-w-[68ch] list-disc gap-3 pl-5">
          <li>
            A numbered edition never changes and may be kept for ever. Everything else that is read is good for a minute
            and has a strong ETag: send it back as If-None-Match, and a 304 says you have it already.
          </li>
          <li>
            Reads may be asked from the pages of any site, without credentials. A ranking may not: it is asked by
            programs, and by our own pages.
          </li>
          <li>
            What goes wrong is told as problem+json (RFC 9457) with {PROBLEM.map(({ path }) => path).join(', ')}; each
            of the errors names a field and says what would be right.
          </li>
          <li>
            null means that something is not stated or was not measured, never no. Lengths are in inches and weights in
            grams as makers state them, luminances in cd/m², prices in minor units of their own currency and never
            converted.
          </li>
          <li>Lists name their pages in the Link header (RFC 8288).</li>
        </ul>
      </section>
      {OPERATIONS.map((one) => (
        <OperationSection key={one.operation.operationId} {...one} origin={origin} />
      ))}
    </main>
  )
}

const PROBLEM = fieldsOf(SCHEMAS.Problem ?? {}).filter(({ path }) => !path.includes('.'))
