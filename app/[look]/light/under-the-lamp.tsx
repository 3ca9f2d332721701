import { Lamp } from '@/components/lamp'
import type { LitRow } from '@/lib/light/ranking'
import type { Lab } from '@/lib/method/types'
import { BesidePaper } from './beside-paper'
import type { LitPage } from './lit-page'

/** The lamp over the first page of the order, in the booth beside the control paper; where there is room for it. */
export function UnderTheLamp({
  row: { device, gloom },
  lux,
  paper,
  paperGloom,
}: {
  row: LitRow<LitPage>
  lux: number
  paper: Lab
  paperGloom: number
}) {
  return (
    <figure className="hidden lg:block">
      <div className="relative overflow-hidden pt-52">
        <Lamp lux={lux} />
        <div className="relative flex justify-center rounded-card border-(length:--sheet-edge) border-black bg-booth px-4 py-5">
          <BesidePaper
            drawn={device.drawn}
            gloom={gloom}
            paper={paper}
            paperGloom={paperGloom}
            className="h-46 w-34 p-3.5 text-[12px]"
          />
        </div>
      </div>
      <figcaption className="mt-3 text-center text-note text-soft">{device.name}, beside our control paper</figcaption>
    </figure>
  )
}
