/** Answers a form does not ask for but must not lose. */
export function HiddenFields({ texts }: { texts: Iterable<readonly [string, string]> }) {
  return Array.from(texts, ([name, text]) => <input key={name} type="hidden" name={name} value={text} />)
}
