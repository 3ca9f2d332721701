import type { Metadata } from 'next'
import { countObtained } from '@/db/queries/units'
import { read } from '@/lib/server/db'
import { Accessibility } from './accessibility'
import { Cautions } from './cautions'
import { Disputes } from './disputes'
import { Conflicts, Money } from './money'
import { Privacy } from './privacy'
import { Rights } from './rights'
import { Team } from './team'
import { Units } from './units'

export const dynamic = 'force-static'
export const revalidate = 60

export const metadata: Metadata = {
  title: 'About',
  description:
    'Who measures, who pays, how every unit was obtained, what we do about conflicts and disputes, what is stored about you, and what our figures cannot say.',
  alternates: { canonical: '/about' },
}

const CONTENTS = [
  ['team', 'Who we are'],
  ['money', 'Who pays'],
  ['units', 'Units bought and lent'],
  ['conflicts', 'Conflicts'],
  ['disputes', 'Disputing a figure'],
  ['privacy', 'Privacy'],
  ['accessibility', 'Accessibility'],
  ['rights', 'Using our figures'],
  ['keep-in-mind', 'What our figures cannot say'],
] as const

export default async function AboutPage() {
  const obtained = await read(countObtained)
  return (
    <main className="measure py-12">
      <h1>About</h1>
      <p className="mt-4 max-w-[60ch] text-lead text-soft">
        Lampleaf reads the pages of electronic-paper devices with an instrument, says how sure it is, and helps you find
        the page that suits the light you read in.
      </p>
      <nav aria-label="On this page" className="mt-8">
        <ul className="flex flex-wrap gap-x-6">
          {CONTENTS.map(([id, title]) => (
            <li key={id}>
              <a href={`#${id}`} className="inline-flex min-h-11 items-center sm:min-h-8">
                {title}
              </a>
            </li>
          ))}
        </ul>
      </nav>
      <div className="mt-10 grid grid-cols-[minmax(0,1fr)] gap-12">
        <Team />
        <Money />
        <Units obtained={obtained} />
        <Conflicts />
        <Disputes />
        <Privacy />
        <Accessibility />
        <Rights />
        <Cautions />
      </div>
    </main>
  )
}
