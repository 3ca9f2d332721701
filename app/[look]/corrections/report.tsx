import Link from 'next/link'
import { CONTACT } from '../about/contact'

/** How a reader, an owner or a maker says that a figure is wrong, and what happens then. */
export function Report() {
  return (
    <section aria-labelledby="report" className="mt-14 border-t border-rule pt-8">
      <h2 id="report">Report one</h2>
      <div className="mt-4 grid max-w-[68ch] gap-4">
        <p>
          Write to <a href={`mailto:${CONTACT.corrections}`}>{CONTACT.corrections}</a>. Tell us the device, the figure
          and the edition it stands in, and what you see instead: another reading with its instrument and geometry, a
          photograph beside a sheet of paper, or plainly what looks wrong. The serial number and firmware of your unit
          help. We do not need to know who you are.
        </p>
        <ol className="grid list-decimal gap-2 pl-5">
          <li>
            We look at the readings and the photographs of the session, and read the unit again where we still can.
          </li>
          <li>If the figure was wrong, we note it here that day, before any edition puts it right.</li>
          <li>If it stands, we say so, and why; what you wrote may stand beside it as a reply, if you want it to.</li>
        </ol>
        <p>
          Makers are answered in the same place and by the same rules; see{' '}
          <Link href="/about#disputes" prefetch={false}>
            how a figure is disputed
          </Link>
          .
        </p>
      </div>
    </section>
  )
}
