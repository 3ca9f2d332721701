import { type APIRequestContext, expect, type Page } from '@playwright/test'

/** What a page is made of, as far as links and search engines care. */
export type Read = {
  lang: string
  titles: string[]
  descriptions: string[]
  canonical: string | null
  robots: string
  headings: number
  ids: string[]
  /** Addresses of `a` and `area`, as they stand. */
  links: string[]
  /** Addresses of icons, manifest and alternates, with what they are. */
  related: { rel: string; type: string; href: string }[]
  /** Pictures without words or without a size of their own, and sheets a screen reader would read out. */
  unnamed: string[]
  structured: string[]
}

/** Reads pages with the browser's own parser; scripts in them do not run. */
export async function readHtml(page: Page, html: string): Promise<Read> {
  return page.evaluate((text) => {
    const found = new DOMParser().parseFromString(text, 'text/html')
    const all = (selector: string) => [...found.querySelectorAll(selector)]
    const attributes = (selector: string, name: string) =>
      all(selector).map((element) => element.getAttribute(name) ?? '')
    return {
      lang: found.documentElement.lang,
      titles: all('head > title, body > title').map((element) => element.textContent ?? ''),
      descriptions: attributes('meta[name="description"]', 'content'),
      canonical: found.querySelector('link[rel="canonical"]')?.getAttribute('href') ?? null,
      robots: found.querySelector('meta[name="robots"]')?.getAttribute('content') ?? '',
      headings: all('h1').length,
      ids: attributes('[id]', 'id'),
      links: attributes('a[href], area[href]', 'href'),
      related: all('link[rel="alternate"], link[rel="icon"], link[rel="apple-touch-icon"], link[rel="manifest"]').map(
        (element) => ({
          rel: element.getAttribute('rel') ?? '',
          type: element.getAttribute('type') ?? '',
          href: element.getAttribute('href') ?? '',
        }),
      ),
      unnamed: [
        ...all('img:not([alt]), img:not([width]), img:not([height])'),
        ...all('[data-sample]:not([aria-hidden="true"])'),
        ...all('svg:not([aria-hidden="true"]):not([role])'),
      ].map((element) => element.outerHTML.slice(0, 120)),
      structured: all('script[type="application/ld+json"]').map((element) => element.textContent ?? ''),
    }
  }, html)
}

/** The paths of the site map, in its order. */
export async function listedPaths(request: APIRequestContext): Promise<string[]> {
  const answer = await request.get('/sitemap.xml')
  expect(answer.status()).toBe(200)
  return [...(await answer.text()).matchAll(/<loc>(.*?)<\/loc>/g)].map(([, address]) => new URL(address!).pathname)
}

/** Does the work for each, a few at a time. */
export async function each<T>(items: readonly T[], work: (item: T) => Promise<void>, together = 6): Promise<void> {
  const queue = [...items]
  const one = async () => {
    for (let item = queue.shift(); item !== undefined; item = queue.shift()) await work(item)
  }
  await Promise.all(Array.from({ length: together }, one))
}
