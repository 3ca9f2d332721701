import Link from 'next/link'
import type { countObtained } from '@/db/queries/units'
import { formatNumber } from '@/lib/format/number'
import { Section } from './section'

type Obtained = Awaited<ReturnType<typeof countObtained>>

const count = (units: number) => `${formatNumber(units)} ${units === 1 ? 'unit' : 'units'}`

/** How the units on the bench were obtained, counted from its records. */
export function Units({ obtained }: { obtained: Obtained }) {
  const sum = (rows: Obtained) => rows.reduce((total, { units }) => total + units, 0)
  const all = sum(obtained)
  const bought = sum(obtained.filter((row) => row.obtained === 'bought'))
  return (
    <Section id="units" title="Units bought and lent">
      {all === 0 ? (
        <p>No unit has been on the bench yet.</p>
      ) : (
        <>
          <p>
            Of the {count(all)} ever on our bench, we bought {formatNumber(bought)} and were lent{' '}
            {formatNumber(all - bought)}:
          </p>
          <ul>
            {obtained.map(({ obtained: how, from, units }) => (
              <li key={`${how} ${from}`}>
                {count(units)} {how} {how === 'bought' ? 'from' : 'by'} {from}
              </li>
            ))}
          </ul>
        </>
      )}
      <p>
        We buy like anybody, without saying who we are, so that a unit is one you might have been sold. A loan is taken
        where a second unit would otherwise be missing; it is read like the others, goes back afterwards, and is named
        as lent on{' '}
        <Link href="/devices" prefetch={false}>
          the device’s page
        </Link>
        , where every unit is listed with how we came by it.
      </p>
    </Section>
  )
}
