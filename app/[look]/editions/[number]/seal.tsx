import { TextToCopy } from '@/components/text-to-copy'
import { documentHash } from '@/lib/edition/seal'
import type { Edition } from '@/lib/method/types'
import { siteUrl } from '@/lib/server/site-url'

/** Python writes these numbers as RFC 8785 asks, and their keys are ASCII; a test holds that. */
const recipe = (url: string) => `curl -s ${url} | python3 -c "
import hashlib, json, sys
document = json.load(sys.stdin)
seal = document.pop('sha256')
text = json.dumps(document, sort_keys=True, separators=(',', ':'), ensure_ascii=False)
print(hashlib.sha256(text.encode()).hexdigest() == seal)"`

/** The edition's seal, whether it still fits the document, and how anybody can find that out. */
export function Seal({ edition }: { edition: Edition }) {
  const fits = documentHash(edition) === edition.sha256
  return (
    <section aria-labelledby="seal">
      <h2 id="seal">Seal</h2>
      <p className="mt-3 font-semibold wrap-anywhere">{edition.sha256}</p>
      <p className="mt-3 max-w-[68ch]">
        The SHA-256 of the document’s canonical JSON (RFC 8785), the field <em>sha256</em> left out.{' '}
        {fits
          ? 'Worked out again from the stored document when this page was made, it is the same.'
          : 'Worked out again when this page was made, it is not the same: do not rely on this edition, and please tell us.'}{' '}
        To check a copy of your own:
      </p>
      <TextToCopy label="Command that checks the seal" text={recipe(siteUrl(`/api/v1/editions/${edition.number}`))} />
      <p className="mt-3 max-w-[68ch] text-soft">
        It prints True where the seal fits. A seal says that a document is the one we released; it cannot say that the
        figures in it are right.
      </p>
    </section>
  )
}
