import { CorrectionEntry } from '../../corrections/correction-entry'
import { withChanges } from '../../corrections/load'
import type { Changelog } from './changelog'

/** The corrections this edition puts right, each with old and new figures. */
export async function Corrected({ changelog }: { changelog: Changelog }) {
  const corrections = await withChanges(changelog.corrected)
  return (
    <section aria-labelledby="corrected">
      <h2 id="corrected">Corrected</h2>
      {corrections.length === 0 ? (
        <p className="mt-3 text-soft">This edition corrects no earlier figure.</p>
      ) : (
        <div className="mt-4 grid grid-cols-[minmax(0,1fr)] gap-8">
          {corrections.map((correction) => (
            <CorrectionEntry key={correction.id} correction={correction} level={3} />
          ))}
        </div>
      )}
    </section>
  )
}
