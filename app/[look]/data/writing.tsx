/** How the files are written, for whoever reads them with a program or opens them in a spreadsheet. */
export function Writing() {
  return (
    <section id="written" aria-labelledby="written-title" className="mt-12 scroll-mt-4">
      <h2 id="written-title">How the files are written</h2>
      <ul className="mt-4 grid max-w-[68ch] list-disc gap-3 pl-5">
        <li>
          The bytes of a released edition never change. A figure that was wrong is put right in a later edition; see its
          changes there. Each file is known by its SHA-256, which is also its ETag.
        </li>
        <li>
          CSV follows RFC 4180: UTF-8 without a byte order mark, a header line, commas, every line ended by CR LF. A
          number has a point, no grouping, a plain hyphen as its minus, and the fewest digits that read back as the same
          double; an exponent is written as 1e-7. Times are UTC.
        </li>
        <li>
          An empty cell says something, and never zero or no. The dictionary tells what for every column; in JSON it is{' '}
          <code>null</code>.
        </li>
        <li>
          A text that a spreadsheet would take for a formula, since it begins with = + - @ or a tab or line end, has one
          apostrophe put before it in the CSV; so has one that begins with apostrophes and then one of these. Take the
          first apostrophe off such a text to have it back. Numbers are never touched, negative ones included, and the
          JSON has every text as it is.
        </li>
        <li>
          The files hold the rows the edition rests on and no others: the sets its figures were worked out from with
          every reading in them, those left out included, and the sessions and controls counted up to its release. What
          may still be put right beside the figures, such as how a unit was obtained or who stated a specification, is
          on the page of the device.
        </li>
      </ul>
    </section>
  )
}
