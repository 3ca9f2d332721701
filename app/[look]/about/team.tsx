import Link from 'next/link'
import { Section } from './section'

export function Team() {
  return (
    <Section id="team" title="Who we are">
      <p>
        A small team with a dark room above a chandler’s in Marlquay, two sphere spectrophotometers, a white tile and a
        drawer of numbered paper. Two of us read, one edits, and the one who edits does not read the units an edition is
        about.
      </p>
      <p>
        We began because we could not find a figure for the one thing we look at all day. Makers state pixels and hours;
        nobody stated how light, how white and how even a page is, or how well they knew it. So that is what we publish,
        with{' '}
        <Link href="/method" prefetch={false}>
          the whole method
        </Link>{' '}
        beside it.
      </p>
      <p className="border-l-4 border-brass-deep pl-4">
        All of this is invented: the town, the team, the makers, the devices and every reading. The computations are
        real and run on the invented readings; the guide is shown here as it would be with true ones. Do not buy
        anything on the strength of it.
      </p>
    </Section>
  )
}
