import { type Column, Table } from '@/components/ui/table'
import { DECIMALS } from '@/lib/findings/decimals'
import { type PublishedFigures, publishedFigures } from '@/lib/findings/published'
import { THIN_SPACE } from '@/lib/format/number'
import type { Edition, EditionDevice } from '@/lib/method/types'
import { FigureText } from '../devices/figure'

type Key = 'lightness' | 'whiteness' | 'tint' | 'chroma' | 'contrast'
const ROWS: { key: Key; name: string }[] = [
  { key: 'lightness', name: 'Lightness L*' },
  { key: 'whiteness', name: 'Whiteness W10 †' },
  { key: 'tint', name: 'Tint T10 †' },
  { key: 'chroma', name: 'Chroma C*' },
  { key: 'contrast', name: 'Contrast, to 1' },
]

/** The figures the differences are of, a column a device. */
export function Figures({ edition, devices }: { edition: Edition; devices: readonly EditionDevice[] }) {
  const figures = devices.map((device) => publishedFigures(edition, device))
  const columns: Column<(typeof ROWS)[number]>[] = [
    { key: 'name', label: 'Figure', head: 'Figure', heading: true, cell: ({ name }) => name },
    ...devices.map(({ slug, name }, i) => ({
      key: slug,
      label: name,
      head: name,
      numeric: true,
      cell: ({ key }: { key: Key }) => <Cell figures={figures[i]!} name={key} />,
    })),
  ]
  return (
    <section aria-labelledby="figures" className="mt-14">
      <h2 id="figures">The figures</h2>
      <Table
        className="mt-4"
        caption={`Each page in full white, front light off: d/8°, specular included, D65, 10° observer. ± at about 95${THIN_SPACE}%, of one figure by itself.`}
        columns={columns}
        rows={ROWS}
        rowKey={({ key }) => key}
      />
    </section>
  )
}

function Cell({ figures, name }: { figures: PublishedFigures; name: Key }) {
  const dagger = (name === 'whiteness' || name === 'tint') && !figures.withinLimits
  return <FigureText figure={figures[name]} decimals={DECIMALS[name]} dagger={dagger} />
}
