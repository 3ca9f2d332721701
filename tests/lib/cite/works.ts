import type { Work } from '@/lib/cite/work'

export const EDITION: Work = {
  title: 'Page figures of electronic-paper devices',
  edition: 3,
  publishedOn: '2026-11-20',
  url: 'https://lampleaf.example/editions/3',
  authors: ['Lampleaf'],
  licence: 'CC-BY-4.0',
}

/** Everything that means something to TeX, BibTeX, YAML or JSON, and letters from outside ASCII. */
export const AWKWARD: Work = {
  title: 'Page & ink: 100 % “white” {really}, a_b #1 $5 ~ ^ \\ "quoted" \' - } { é ø 纸 \u2028 \u0085 \t end',
  edition: 12,
  publishedOn: '2026-01-05',
  url: 'https://lampleaf.example/a_b?c=%20&d={e}#f',
  authors: ['Lampleaf: the bench, & friends', 'Marlquay #2'],
}
