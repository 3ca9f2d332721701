import { text } from '../../words'
import { Tap } from './tap'

export const dynamic = 'force-static'
export const revalidate = 60

/** A static page as long as one likes, with one thing to tap. */
export default async function Page({ params }) {
  const { words } = await params
  const paragraphs = Array.from({ length: 8 }, (_, i) => i)
  const all = text(Number(words)).split(' ')
  const each = Math.ceil(all.length / paragraphs.length)
  return (
    <main>
      <h1>A bare page</h1>
      <Tap />
      {paragraphs.map((i) => (
        <p key={i}>{all.slice(i * each, (i + 1) * each).join(' ')}</p>
      ))}
    </main>
  )
}
