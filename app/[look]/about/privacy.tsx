import { LOOK_COOKIE } from '@/lib/look'
import { CONTACT } from './contact'
import { Section } from './section'

export function Privacy() {
  return (
    <Section id="privacy" title="Privacy">
      <p>You can use all of this guide without an account; there are none to have.</p>
      <ul>
        <li>
          <strong>One cookie, and only if you ask.</strong> Choose a theme or units at the foot of a page and the cookie{' '}
          <em>{LOOK_COOKIE}</em> keeps that choice for a year. It holds two words, such as night-inch. Choose Automatic
          and millimetres again and it is gone.
        </li>
        <li>
          <strong>Your answers are in the address.</strong> The quiz keeps them in the address of the page and nowhere
          else in your browser. Whoever you send the address to can read them, and so can anyone who sees your browser’s
          history.
        </li>
        <li>
          <strong>Our server sees what it is asked.</strong> When it works out a result it reads the answers from the
          address. It keeps the ranking in its memory, without a word of who asked, so that the same question need not
          be worked out twice; a restart forgets it. Nothing you answer is written to the database.
        </li>
        <li>
          <strong>No log of visits.</strong> The program writes none; it writes down its own errors. A server that
          stands in front of it may keep the usual record of addresses asked for, and whoever runs one has to say so
          here.
        </li>
        <li>
          <strong>Nobody else.</strong> Type, charts and scripts all come from this site, and the page’s policy forbids
          your browser to load any from elsewhere. There is no statistics service and no pixel.
        </li>
      </ul>
      <p>
        Questions: <a href={`mailto:${CONTACT.privacy}`}>{CONTACT.privacy}</a>
      </p>
    </Section>
  )
}
