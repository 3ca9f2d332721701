const conjunction = new Intl.ListFormat('en-GB', { type: 'conjunction' })

/** Names in a sentence: "A", "A and B", "A, B and C". */
export function formatList(names: readonly string[]): string {
  return conjunction.format(names)
}
