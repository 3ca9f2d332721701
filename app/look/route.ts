import { DEFAULT_LOOK, LOOK_COOKIE, type Look, lookName, parseLook, parseTheme, UNITS } from '@/lib/look'
import { config } from '@/lib/server/config'
import { isFromThisSite, ownPath, ownReferer } from '@/lib/server/same-origin'

const A_YEAR = 365 * 24 * 60 * 60
/** Bytes; the form sends the name of a choice and the address of the page, the quiz's answers in it. */
const LARGEST_BODY = 16 * 1024

/** Keeps the chosen theme or units in a cookie, drops it where all is automatic, and goes back to where the reader was. */
export async function POST(request: Request): Promise<Response> {
  if (!isFromThisSite(request.headers)) return refuse(403, 'This form can only be sent from a page of this site.')
  if (Number(request.headers.get('content-length') ?? Infinity) > LARGEST_BODY)
    return refuse(413, 'That is more than the name of a look and a way back.')

  const form = new URLSearchParams(await request.text())
  const look = chosen(form, lookIn(request.headers.get('cookie')))
  if (!look)
    return refuse(400, 'Send theme as day, night, paper or automatic, or units as metric or inch, from a form.')

  const name = lookName(look)
  const isDefault = name === lookName(DEFAULT_LOOK)
  const secure = config().baseUrl.startsWith('https:') ? '; Secure' : ''
  return new Response(null, {
    status: 303,
    headers: {
      // A path alone, so that no header of the request can send anyone elsewhere.
      Location: ownPath(form.get('back')) ?? ownReferer(request.headers),
      'Set-Cookie': `${LOOK_COOKIE}=${isDefault ? '' : name}; Path=/; Max-Age=${isDefault ? 0 : A_YEAR}; SameSite=Lax; HttpOnly${secure}`,
      'Cache-Control': 'no-store',
    },
  })
}

/** The look the reader had, changed by what the form says; null where it says nothing we know. */
function chosen(form: URLSearchParams, had: Look): Look | null {
  const [theme, units] = [form.get('theme'), UNITS.find((one) => one === form.get('units'))]
  if (theme !== null) return theme === 'automatic' || parseTheme(theme) ? { ...had, theme: parseTheme(theme) } : null
  return units ? { ...had, units } : null
}

function lookIn(cookies: string | null): Look {
  const pair = cookies?.split(/;\s*/).find((one) => one.startsWith(`${LOOK_COOKIE}=`))
  return parseLook(pair?.slice(LOOK_COOKIE.length + 1)) ?? DEFAULT_LOOK
}

function refuse(status: number, message: string): Response {
  return new Response(`${message}\n`, {
    status,
    headers: { 'Content-Type': 'text/plain; charset=utf-8', 'Cache-Control': 'no-store' },
  })
}
