/** Structured data of a page (JSON-LD 1.1). `<` is escaped, so that no text in it can end the script element. */
export function JsonLd({ data }: { data: object }) {
  const json = JSON.stringify(data).replaceAll('<', '\\u003c')
  // biome-ignore lint/security/noDangerouslySetInnerHtml: a data block holds no markup, and nothing in it is executed
  return <script type="application/ld+json" dangerouslySetInnerHTML={{ __html: json }} />
}
