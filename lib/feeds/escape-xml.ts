// What XML 1.0 does not allow even when escaped: control characters, half surrogate pairs, U+FFFE and U+FFFF (section 2.2).
const NOT_XML = /[^\t\n\r\u0020-\ud7ff\ue000-\ufffd\u{10000}-\u{10ffff}]/gu

const ENTITIES: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&apos;' }

/** Text for an element or an attribute of XML; what XML cannot hold is left out. */
export function escapeXml(text: string): string {
  return text.replace(NOT_XML, '').replace(/[&<>"']/g, (character) => ENTITIES[character] ?? character)
}
