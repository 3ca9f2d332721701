import Link from 'next/link'
import type { DeviceRecord } from '@/db/queries/devices'
import { formatDay } from '@/lib/format/date'

/** Where a correction stands among all of them. */
export function correctionHref(id: number): string {
  return `/corrections#correction-${id}`
}

/** Public notes that a figure of this device was wrong, what was done, and what others answered. */
export function Corrections({ corrections }: { corrections: DeviceRecord['corrections'] }) {
  return (
    <section aria-labelledby="corrections" className="mt-14 max-w-[68ch] print:hidden">
      <h2 id="corrections">Corrections and replies</h2>
      {corrections.length === 0 ? (
        <p className="mt-3 text-soft">No figure of this device has been corrected.</p>
      ) : (
        <ul className="mt-4 grid gap-6">
          {corrections.map((correction) => (
            <Correction key={correction.id} correction={correction} />
          ))}
        </ul>
      )}
    </section>
  )
}

function Correction({
  correction: { id, notedOn, figure, note, wrongIn, rightIn, replies },
}: {
  correction: DeviceRecord['corrections'][number]
}) {
  return (
    <li className="border-l-4 border-brass-deep pl-5">
      <h3>
        <Link href={correctionHref(id)} prefetch={false} className="text-ink">
          {figure}
        </Link>
      </h3>
      <p className="text-note text-soft">
        <time dateTime={notedOn}>{formatDay(notedOn)}</time>
        {wrongIn !== null && `, wrong in edition ${wrongIn}`}
        {rightIn === null ? ', not put right in an edition yet' : `, put right in edition ${rightIn}`}
      </p>
      <p className="mt-2">{note}</p>
      {replies.map((reply) => (
        <blockquote key={reply.id} className="mt-3 border-l border-edge pl-4">
          <p>{reply.note}</p>
          <footer className="text-note text-soft">
            {reply.from}, <time dateTime={reply.repliedOn}>{formatDay(reply.repliedOn)}</time>
          </footer>
        </blockquote>
      ))}
    </li>
  )
}
