import type { Step } from '@/lib/workings/step'

/** Steps of a worked figure: formula, numbers put in, what comes out, and where each is from. */
export function StepsList({ title, steps }: { title: string; steps: readonly Step[] }) {
  return (
    <ol aria-label={title} className="border-t border-rule">
      {steps.map(({ id, name, formula, worked, result, source, note }) => (
        <li key={id} className="grid gap-x-8 gap-y-1 border-b border-rule py-3 md:grid-cols-[15rem_minmax(0,1fr)]">
          <div>
            <p className="font-semibold">{name}</p>
            <p className="text-note text-soft">{source}</p>
          </div>
          <div className="grid min-w-0 content-start gap-1 wrap-anywhere">
            <p className="font-heading text-soft">{formula}</p>
            <p className="font-heading">{worked}</p>
            <p className="font-semibold tabular-nums">{result}</p>
            {note && <p className="text-small text-soft">{note}</p>}
          </div>
        </li>
      ))}
    </ol>
  )
}
