import type { ReactNode } from 'react'
import type { SectionId } from './contents'
import { QUANTITIES, type Quantity } from './quantities'

/** One section of the method: its heading, plain words first, and the quantities it defines as targets of links. */
export function MethodSection({
  id,
  number,
  title,
  children,
}: {
  id: SectionId
  number: number
  title: string
  children: ReactNode
}) {
  const defined = QUANTITIES.filter(({ section }) => section === id)
  return (
    <section id={id} aria-labelledby={`${id}-title`} className="mt-14 scroll-mt-4 border-t border-rule pt-8">
      <h2 id={`${id}-title`}>
        {number}. {title}
      </h2>
      {children}
      {defined.length > 0 && <Quantities quantities={defined} title={title} />}
    </section>
  )
}

/** What comes out of a section: each figure we publish, its unit, and how it comes about. */
function Quantities({ quantities, title }: { quantities: readonly Quantity[]; title: string }) {
  return (
    <dl
      className="mt-8 grid gap-x-10 gap-y-4 border-l-4 border-shade pl-5 md:grid-cols-2"
      aria-label={`Published from “${title}”`}
    >
      {quantities.map(({ id, name, symbol, unit, how }) => (
        <div key={id} id={`q-${id}`}>
          <dt className="font-semibold">
            {name}
            {symbol && (
              <>
                , <Sign {...symbol} />
              </>
            )}
          </dt>
          <dd className="text-soft">
            {how} Unit: {unit}.
          </dd>
        </div>
      ))}
    </dl>
  )
}

function Sign({ base, sub }: NonNullable<Quantity['symbol']>) {
  return (
    <var className="not-italic">
      {base}
      {sub && <sub>{sub}</sub>}
    </var>
  )
}

/** A formula on lines of its own, in words a screen reader can say. */
export function Formula({ children }: { children: ReactNode }) {
  return (
    <div className="my-5 border-y border-rule bg-sheet px-5 py-4 font-heading text-lead leading-loose">{children}</div>
  )
}

export function Prose({ children }: { children: ReactNode }) {
  return <div className="mt-4 grid max-w-[68ch] gap-4 [&_ul]:list-disc [&_ul]:pl-5">{children}</div>
}
