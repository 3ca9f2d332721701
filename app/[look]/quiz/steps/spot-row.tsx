import { Disclosure } from '@/components/ui/disclosure'
import { FieldError } from '@/components/ui/field'
import { formatLux, THIN_SPACE } from '@/lib/format/number'
import type { SPOTS } from '@/lib/method/spots'
import { plainNumber } from '@/lib/quiz/values'
import { HoursControl } from './hours-control'
import { LightFields } from './light-fields'
import { LightPatch } from './light-patch'
import type { StepProps } from './step-body'

/** A listed spot: its light in words, hours, and behind a disclosure what one may change about it. */
export function SpotRow({ spot, text, error }: { spot: (typeof SPOTS)[number] } & StepProps) {
  const { slug, name } = spot
  const lux = text(`${slug}.lux`) ?? String(spot.lux)
  const frontLight = (text(`${slug}.light`) ?? (spot.frontLight ? 'on' : 'off')) === 'off' ? 'off' : 'on'
  const shownLux = plainNumber(lux)
  const wrong = error(slug)
  return (
    <fieldset className="border-b border-rule py-2.5">
      <legend className="sr-only">{name}</legend>
      {wrong && <FieldError id={slug}>{wrong}</FieldError>}
      <div className="grid grid-cols-[auto_minmax(0,1fr)_auto] items-start">
        <LightPatch lux={shownLux ?? spot.lux} />
        <p aria-hidden="true" className="col-start-2 row-start-1 pt-0.5 leading-snug font-semibold sm:text-lead">
          {name}
        </p>
        <div className="col-start-3 row-start-1 pl-3 sm:pl-4.5">
          <HoursControl name={slug} where={name} defaultValue={text(slug)} error={wrong} />
        </div>
        <Disclosure
          className="col-span-2 col-start-2 row-start-2 text-note sm:-mt-4 sm:[&>summary]:min-h-8"
          open={Boolean(error(`${slug}.lux`) || error(`${slug}.light`))}
          summary={
            <span>
              about {shownLux === undefined ? lux : `${formatLux(shownLux)}${THIN_SPACE}lux`}
              {frontLight === 'on' ? ', front light if wanted' : ', no front light'}
              <span className="sr-only"> (change the light of {name})</span>
            </span>
          }
        >
          <div className="pt-2 pb-3">
            <LightFields base={slug} where={name} lux={lux} frontLight={frontLight} error={error} />
          </div>
        </Disclosure>
      </div>
    </fieldset>
  )
}
