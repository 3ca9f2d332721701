/** Text to copy as it stands, a citation or a request; long lines scroll inside. */
export function TextToCopy({ label, text }: { label: string; text: string }) {
  return (
    <section
      aria-label={label}
      className="mt-2 max-w-200 overflow-x-auto border border-rule bg-sheet p-4"
      // biome-ignore lint/a11y/noNoninteractiveTabindex: what scrolls sideways must be reachable by keyboard
      tabIndex={0}
    >
      <pre className="font-text text-note">{text}</pre>
    </section>
  )
}
