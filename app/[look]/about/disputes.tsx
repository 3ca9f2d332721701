import Link from 'next/link'
import { CONTACT } from './contact'
import { Section } from './section'

export function Disputes() {
  return (
    <Section id="disputes" title="Disputing a figure">
      <p>
        Anybody may say that a figure is wrong: an owner whose page looks otherwise, a maker, a second laboratory. Write
        to <a href={`mailto:${CONTACT.corrections}`}>{CONTACT.corrections}</a> with the device, the figure and the
        edition it stands in.
      </p>
      <ul>
        <li>
          Every reading a figure rests on is on the device’s page and in{' '}
          <Link href="/data" prefetch={false}>
            the data
          </Link>
          , so you can work it out again before you write.
        </li>
        <li>
          What turns out wrong is noted among the{' '}
          <Link href="/corrections" prefetch={false}>
            corrections
          </Link>{' '}
          at once, and put right in a later edition; the wrong one stays as it was printed.
        </li>
        <li>
          What stands is answered too. Your words can be printed beside the figure as a reply, under your role, if you
          agree.
        </li>
        <li>
          A figure of yours by another geometry or observer is no contradiction, only another figure; do tell us, with
          both.
        </li>
      </ul>
      <p>
        Makers’ press offices: <a href={`mailto:${CONTACT.makers}`}>{CONTACT.makers}</a>. You get the same answer as an
        owner, in the same place. To correct a stated fact, send the page or sheet that states it, with its date.
      </p>
      <p className="text-small text-soft">
        The addresses end in .example and reach nobody, since the team is invented.
      </p>
    </Section>
  )
}
