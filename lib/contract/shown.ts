const LONGEST = 60

/** What was given, short enough and plain enough to stand in a message: strings quoted, lists and objects by kind. */
export function shown(given: unknown): string {
  if (given === undefined) return 'missing'
  if (given === null) return 'null'
  if (Array.isArray(given)) return given.length === 0 ? 'an empty list' : 'a list'
  if (typeof given === 'object') return 'an object'
  if (typeof given === 'string') return JSON.stringify(clip(given))
  if (typeof given === 'number') return String(given).replace('-', '−')
  return String(given)
}

/** A name or text cut to a length fit for a message. */
export function clip(text: string): string {
  const characters = Array.from(text)
  return characters.length > LONGEST ? `${characters.slice(0, LONGEST).join('')}…` : text
}
