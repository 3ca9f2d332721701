/** What is on this page, each leading to its part. */
export function Contents({ parts }: { parts: readonly { id: string; name: string }[] }) {
  return (
    <nav aria-labelledby="contents" className="mt-10 border-y border-rule py-4">
      <h2 id="contents" className="font-text text-small font-semibold">
        On this page
      </h2>
      <ul className="mt-1 flex flex-wrap gap-x-6">
        {parts.map(({ id, name }) => (
          <li key={id}>
            <a href={`#${id}`} className="inline-flex min-h-11 items-center text-small">
              {name}
            </a>
          </li>
        ))}
      </ul>
    </nav>
  )
}
