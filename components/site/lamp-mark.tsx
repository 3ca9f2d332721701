/** The mark: a reading lamp over a sheet of paper. Decoration beside the name. */
export function LampMark({ className = 'size-8' }: { className?: string }) {
  return (
    <svg aria-hidden="true" viewBox="0 0 32 32" className={className} fill="none">
      <path d="M16 1.5v3" stroke="var(--color-brass)" strokeWidth="2" />
      <path d="M7.5 13c0-5 3.8-9 8.5-9s8.5 4 8.5 9z" fill="var(--color-shade)" />
      <path d="M4.5 14h23" stroke="var(--color-brass)" strokeWidth="2.2" strokeLinecap="round" />
      <path d="M9 18.8h14v10.7H9z" stroke="var(--color-ink)" strokeWidth="1.8" strokeLinejoin="round" />
      <path d="M12 22.4h8M12 25.8h5" stroke="var(--color-ink)" strokeWidth="1.6" strokeLinecap="round" />
    </svg>
  )
}
