/** Names, labels and the address of the worked example; free of the schema, so that the page opens light. */

export const FIELDS = [
  'from',
  'pageL',
  'pageA',
  'pageB',
  'inkL',
  'inkA',
  'inkB',
  'pageReadings',
  'inkReadings',
  'units',
  'positions',
  'lux',
  'frontLight',
  'age',
  'text',
] as const
export type FieldName = (typeof FIELDS)[number]
export type Texts = Record<FieldName, string>
export type Problem = { id: FieldName; message: string }

export const LABELS: Record<FieldName, string> = {
  from: 'Colours of page and ink',
  pageL: 'L* of the page',
  pageA: 'a* of the page',
  pageB: 'b* of the page',
  inkL: 'L* of the ink',
  inkA: 'a* of the ink',
  inkB: 'b* of the ink',
  pageReadings: 'Readings of the page',
  inkReadings: 'Readings of the ink',
  units: 'Units measured',
  positions: 'Places measured, over all units',
  lux: 'Light on the page',
  frontLight: 'Front light, at most',
  age: 'Age of the eye',
  text: 'Size of the text',
}

type Search = { get: (name: string) => string | null; getAll?: (name: string) => string[] }

/** The form's texts as an address holds them, the rest from `otherwise`; a name given twice is not understood. */
export function textsFrom(search: Search, otherwise: Texts): Texts {
  const texts = { ...otherwise }
  for (const name of FIELDS) {
    const all = search.getAll?.(name)
    const given = all && all.length > 1 ? null : search.get(name)
    if (given !== null) texts[name] = given
  }
  return texts
}

/** Whether an address says anything of the example. */
export function hasExample(search: Search): boolean {
  return FIELDS.some((name) => search.get(name) !== null)
}

/** The example in an address: only what the chosen way needs. */
export function queryOf(texts: Texts): string {
  const unused = texts.from === 'readings' ? /^(page|ink)[LAB]$/ : /Readings$/
  const kept = FIELDS.filter((name) => !unused.test(name)).map((name) => [name, texts[name].replaceAll('\r', '')])
  return new URLSearchParams(kept).toString()
}
