import { type Column, Table } from '@/components/ui/table'
import { formatExact } from '@/lib/format/number'
import { DEFAULT_ANSWERS, MAX_SPOTS, SPOTS } from '@/lib/method/spots'
import { MethodSection, Prose } from '../parts'

type Spot = (typeof SPOTS)[number]
const columns: Column<Spot>[] = [
  { key: 'name', head: 'Where', label: 'Where', heading: true, cell: ({ name }) => name },
  {
    key: 'lux',
    head: 'Light on the page, lux',
    label: 'Light on the page, lux',
    numeric: true,
    cell: ({ lux }) => formatExact(lux),
  },
  {
    key: 'front-light',
    head: 'Front light',
    label: 'Front light',
    cell: ({ frontLight }) => (frontLight ? 'may be used' : 'off'),
  },
]

/** The name of the spot an assumed light belongs to. */
const nameOf = (lux: number) => SPOTS.find((spot) => spot.lux === lux)?.name ?? `${formatExact(lux)} lux`

export function SpotsSection() {
  const { spots, reads, hold, lightNeed, text, preferredWhite } = DEFAULT_ANSWERS
  return (
    <MethodSection id="spots" number={0} title="Reading spots, and what we assume">
      <Prose>
        <p>
          You tell us where you read and for how many hours. Each place stands for a light on the page, in lux, and for
          whether a front light would be turned on there. The lights are the middles of wide bands (common practice, no
          source), not measurements of your room; you may change them, or add places of your own, {MAX_SPOTS} at most.
        </p>
      </Prose>
      <Table
        caption="Reading spots"
        columns={columns}
        rows={SPOTS}
        rowKey={({ slug }) => slug}
        className="mt-6 max-w-208"
      />
      <Prose>
        <p>What you do not answer is assumed, and every result names it:</p>
        <ul>
          {spots.map(({ lux, hours }) => (
            <li key={lux}>
              You read “{nameOf(lux)}”, {formatExact(hours)} hours a week.
            </li>
          ))}
          <li>
            You read{' '}
            {Object.entries(reads)
              .map(([kind, share]) => `${kind} ${formatExact(share)}`)
              .join(' parts and ')}{' '}
            part, and hold the device {hold === 'two-hands' ? 'in two hands' : hold}.
          </li>
          <li>
            Your need of light is {lightNeed}, your text {text} in size, the white you like {preferredWhite}.
          </li>
          <li>All four aims matter alike, and nothing is ruled out.</li>
        </ul>
      </Prose>
    </MethodSection>
  )
}
