import { text } from '../../words'
import { Tap } from './tap'

export const dynamic = 'force-static'
export const revalidate = 60

const ROWS = Array.from({ length: 16 }, (_, row) => row + 1)

/** A static page as long as one likes, with what any page of such an application has to touch: one thing of each kind. */
export default async function Page({ params }) {
  const { words } = await params
  const paragraphs = Array.from({ length: 8 }, (_, i) => i)
  const all = text(Number(words)).split(' ')
  const each = Math.ceil(all.length / paragraphs.length)
  return (
    <main>
      <h1>A bare page</h1>
      <Tap />
      <details>
        <summary>A table</summary>
        <table>
          <tbody>
            {ROWS.map((row) => (
              <tr key={row}>
                {ROWS.slice(0, 6).map((column) => (
                  <td key={column}>{row * column}</td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </details>
      <p>
        <label htmlFor="field">A field</label> <input id="field" /> <a href="/pad/0">The shortest page</a>
      </p>
      {paragraphs.map((i) => (
        <p key={i}>{all.slice(i * each, (i + 1) * each).join(' ')}</p>
      ))}
    </main>
  )
}
