import { answerOurselves } from './answer-ourselves.mjs'

const STYLE =
  'body{margin:0;font:1.125rem/1.5 system-ui,sans-serif;background:#f4f6f5;color:#14211c}main{max-width:38rem;margin:0 auto;padding:4rem 1.25rem}h1{font:600 2rem/1.15 Georgia,serif}a{color:#0d5a43}@media(prefers-color-scheme:dark){body{background:#0f1a16;color:#e8efeb}a{color:#62c3a0}}'

const HTML = `<!doctype html>
<html lang="en-GB">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>Not available just now · Lampleaf</title>
<style>${STYLE}</style>
</head>
<body>
<main>
<h1>This page could not be made just now</h1>
<p>Something on our side did not answer in time. It is most likely over in a minute.</p>
<p>Reload this page to try again. Your answers are still in its address, and nothing you entered is lost.</p>
<p><a href="/">Go to the start</a></p>
</main>
</body>
</html>
`

/** Seconds after which it is worth asking again. */
const RETRY_AFTER = 30

/** Answers a page request while something behind the site is away (RFC 9110, 15.6.4). It needs no script and no file. */
export function sendOutagePage(response) {
  answerOurselves(response, 503, HTML, {
    'Content-Type': 'text/html; charset=utf-8',
    'Retry-After': String(RETRY_AFTER),
  })
}
