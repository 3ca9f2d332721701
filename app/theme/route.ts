import { config } from '@/lib/server/config'
import { isFromThisSite, ownPath, ownReferer } from '@/lib/server/same-origin'
import { parseTheme, THEME_COOKIE } from '@/lib/theme'

const A_YEAR = 365 * 24 * 60 * 60
/** Bytes; the form sends the name of a theme and the address of the page, the quiz's answers in it. */
const LARGEST_BODY = 16 * 1024

/** Keeps the chosen theme in a cookie, or drops the cookie for "automatic", and goes back to where the reader was. */
export async function POST(request: Request): Promise<Response> {
  if (!isFromThisSite(request.headers)) return refuse(403, 'This form can only be sent from a page of this site.')
  if (Number(request.headers.get('content-length') ?? Infinity) > LARGEST_BODY)
    return refuse(413, 'That is more than the name of a theme and a way back.')

  const form = new URLSearchParams(await request.text())
  const choice = form.get('theme')
  const theme = parseTheme(choice)
  if (!theme && choice !== 'automatic')
    return refuse(400, 'Send theme as one of day, night, paper or automatic, from a form.')

  const secure = config().baseUrl.startsWith('https:') ? '; Secure' : ''
  return new Response(null, {
    status: 303,
    headers: {
      // A path alone, so that no header of the request can send anyone elsewhere.
      Location: ownPath(form.get('back')) ?? ownReferer(request.headers),
      'Set-Cookie': `${THEME_COOKIE}=${theme ?? ''}; Path=/; Max-Age=${theme ? A_YEAR : 0}; SameSite=Lax; HttpOnly${secure}`,
      'Cache-Control': 'no-store',
    },
  })
}

function refuse(status: number, message: string): Response {
  return new Response(`${message}\n`, {
    status,
    headers: { 'Content-Type': 'text/plain; charset=utf-8', 'Cache-Control': 'no-store' },
  })
}
