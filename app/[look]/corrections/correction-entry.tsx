import Link from 'next/link'
import { raisedBy } from '@/lib/edition/raised'
import { formatDay } from '@/lib/format/date'
import type { ShownCorrection } from './load'
import { MovedFigures } from './moved-figures'

/** One correction: what was wrong, where it stands, old and new figures, who raised it, and every reply. */
export function CorrectionEntry({ correction, level = 2 }: { correction: ShownCorrection; level?: 2 | 3 }) {
  const { id, slug, name, figure, note, notedOn, wrongIn, rightIn, replies, change } = correction
  const raised = raisedBy(correction)
  const Heading = `h${level}` as const
  return (
    <article id={`correction-${id}`} className="scroll-mt-4 border-t border-rule pt-6">
      <Heading className="text-h3">
        <Link href={`/devices/${slug}`} prefetch={false}>
          {name}
        </Link>
        : {figure[0]?.toLowerCase()}
        {figure.slice(1)}
      </Heading>
      <dl className="mt-3 flex flex-wrap gap-x-8 gap-y-1 text-small">
        <Fact term="Noted">
          <time dateTime={notedOn}>{formatDay(notedOn)}</time>
        </Fact>
        {wrongIn !== null && (
          <Fact term="Wrong in">
            <EditionLink number={wrongIn} />
          </Fact>
        )}
        <Fact term="Status">
          {rightIn === null ? (
            'open, not put right in an edition yet'
          ) : (
            <>
              put right in <EditionLink number={rightIn} />
            </>
          )}
        </Fact>
        {raised && (
          <Fact term="Raised by">
            {raised.from[0]?.toLowerCase()}
            {raised.from.slice(1)}, <time dateTime={raised.repliedOn}>{formatDay(raised.repliedOn)}</time>
          </Fact>
        )}
      </dl>
      <p className="mt-3 max-w-[68ch]">{note}</p>
      {change && change.figures.length > 0 && wrongIn !== null && rightIn !== null && (
        <div className="mt-4 max-w-200">
          <MovedFigures
            figures={change.figures}
            from={wrongIn}
            to={rightIn}
            caption={`Every figure of ${name} that differs between edition ${wrongIn} and edition ${rightIn}. ± is the doubt of the difference, at about 95 %.`}
          />
        </div>
      )}
      {replies.length > 0 && <Replies replies={replies} level={level === 2 ? 3 : 4} />}
    </article>
  )
}

function Fact({ term, children }: { term: string; children: React.ReactNode }) {
  return (
    <div className="flex gap-2">
      <dt className="text-soft">{term}</dt>
      <dd>{children}</dd>
    </div>
  )
}

function EditionLink({ number }: { number: number }) {
  return (
    <Link href={`/editions/${number}`} prefetch={false}>
      edition {number}
    </Link>
  )
}

function Replies({ replies, level }: { replies: ShownCorrection['replies']; level: 3 | 4 }) {
  const Heading = `h${level}` as const
  return (
    <div className="mt-5 max-w-[68ch]">
      <Heading className="font-text text-body font-semibold">
        {replies.length === 1 ? 'A reply' : `${replies.length} replies`}
      </Heading>
      {replies.map(({ id, from, repliedOn, note }) => (
        <blockquote key={id} className="mt-3 border-l-3 border-edge pl-4">
          <p>{note}</p>
          <footer className="text-note text-soft">
            {from}, <time dateTime={repliedOn}>{formatDay(repliedOn)}</time>
          </footer>
        </blockquote>
      ))}
    </div>
  )
}
