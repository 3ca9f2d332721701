import Link from 'next/link'
import { LICENCE } from '@/lib/dataset/about'
import { Section } from './section'

export function Rights() {
  return (
    <Section id="rights" title="Using our figures">
      <ul>
        <li>
          <strong>Data:</strong> <a href={LICENCE.url}>{LICENCE.title}</a>. Copy it, change it, sell what you make of
          it; name Lampleaf and the edition, and say what you changed. Each{' '}
          <Link href="/editions" prefetch={false}>
            edition
          </Link>{' '}
          has a citation to copy.
        </li>
        <li>
          <strong>Type:</strong> Petrona and Atkinson Hyperlegible Next, each under the SIL Open Font License 1.1; the
          licences come with the fonts: <a href="/fonts/petrona-LICENSE.txt">of Petrona</a>,{' '}
          <a href="/fonts/atkinson-hyperlegible-next-LICENSE.txt">of Atkinson Hyperlegible Next</a>.
        </li>
        <li>
          <strong>Our words and drawings</strong> are ours; quote them as you would any book.
        </li>
        <li>
          <strong>Not yours to borrow:</strong> our name as an award. “First for a dim bedroom in edition 3” is a fact
          one may cite with its edition and its doubt; a badge is not something we give.
        </li>
      </ul>
    </Section>
  )
}
