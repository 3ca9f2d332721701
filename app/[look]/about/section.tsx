import type { ReactNode } from 'react'

/** One subject of the page: a heading one can link to, and running text. */
export function Section({ id, title, children }: { id: string; title: string; children: ReactNode }) {
  return (
    <section
      id={id}
      aria-labelledby={`${id}-title`}
      className="grid scroll-mt-4 gap-x-12 gap-y-4 border-t border-rule pt-6 lg:grid-cols-[17rem_minmax(0,1fr)]"
    >
      <h2 id={`${id}-title`} className="text-h3">
        {title}
      </h2>
      <div className="grid max-w-[68ch] grid-cols-[minmax(0,1fr)] gap-4 [&_ul]:grid [&_ul]:list-disc [&_ul]:gap-2 [&_ul]:pl-5">
        {children}
      </div>
    </section>
  )
}
