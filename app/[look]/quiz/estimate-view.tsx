'use client'

import { type FormEvent, type ReactNode, useEffect, useRef } from 'react'
import { Button, ButtonLink } from '@/components/ui/button'
import { NumberField, SelectField } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { RadioGroup } from '@/components/ui/radio-group'
import { formatLux, formatNumber, formatUnit, THIN_SPACE } from '@/lib/format/number'
import { SPOTS } from '@/lib/method/spots'
import type { Address } from '@/lib/quiz/address'
import { BAND_FACTOR, BULBS, type Estimate, SIGHTS } from '@/lib/quiz/estimate'
import { CAMERA_RANGE, DISTANCE_RANGE, LUMEN_RANGE, readEstimate } from '@/lib/quiz/estimate-form'
import { type EstimateTarget, quizHref, withLux } from '@/lib/quiz/moves'
import { canonicalTexts, queryOf } from '@/lib/quiz/write-address'
import { HiddenFields } from './hidden-fields'

/**
 * Helps to a number of lux for one spot in three ways: what one can see there, a lamp's light and distance, a camera.
 * Each is a form of its own, and its outcome is offered to be used.
 */
export function EstimateView({
  target,
  address,
  search,
  go,
}: {
  target: EstimateTarget
  address: Address
  search: { get: (name: string) => string | null }
  go: (href: string) => void
}) {
  const heading = useRef<HTMLHeadingElement>(null)
  const outcome = useRef<HTMLDivElement>(null)
  const { way, estimate, problem } = readEstimate(search)
  const asked = way !== null
  useEffect(() => {
    if (asked) outcome.current?.focus()
    else heading.current?.focus()
  }, [asked])

  const texts = [...canonicalTexts(address)]
  const back = quizHref(2, address)
  const text = (name: string) => search.get(name) ?? undefined

  function workOut(event: FormEvent<HTMLFormElement>) {
    event.preventDefault()
    const pairs = Array.from(new FormData(event.currentTarget), ([name, value]) => [name, String(value)] as const)
    go(`/quiz?${queryOf(pairs)}`)
  }
  const form = (name: string, title: string, children: ReactNode) => (
    <form
      action="/quiz"
      autoComplete="off"
      noValidate
      onSubmit={workOut}
      className="grid gap-4 border-t border-rule pt-6"
    >
      <h2 className="text-h3">{title}</h2>
      <HiddenFields texts={[['step', '2'], ['estimate', target], ['way', name], ...texts]} />
      {children}
      <Button type="submit" look="quiet" className="justify-self-start">
        Work it out
      </Button>
    </form>
  )

  return (
    <div className="grid gap-7 pb-12">
      <div>
        <p className="text-small text-soft">Step 2 of 5, a helper</p>
        <h1 ref={heading} tabIndex={-1} className="mt-1">
          How much light is there?
        </h1>
        <p className="mt-3 max-w-[58ch] text-soft">
          For “{nameOf(target, address)}”. Choose whichever you can answer. The outcome is a band, not a measurement,
          and a rough one serves: eyes go by ratios, and half or twice the light is a small step.
        </p>
      </div>

      {asked && (
        <div ref={outcome} tabIndex={-1} role="status">
          {estimate ? (
            <Outcome
              estimate={estimate}
              target={target}
              texts={texts}
              onUse={(lux) => go(quizHref(2, withLux(target, lux, address)))}
            />
          ) : (
            <Notice look="error">{problem}</Notice>
          )}
        </div>
      )}

      {form(
        'see',
        'By what you can see there',
        <RadioGroup
          name="see"
          legend="Which comes nearest?"
          options={SIGHTS.map(({ words }, i) => ({ value: String(i + 1), label: words }))}
          defaultValue={text('see')}
        />,
      )}
      {form(
        'lamp',
        'By the lamp and its distance',
        <>
          <div className="grid items-end gap-4 sm:grid-cols-3">
            <SelectField
              name="lamp"
              label="The bulb"
              defaultValue={text('lamp') ?? '470'}
              options={BULBS.map(({ lumens, name }) => ({
                value: String(lumens),
                label: `${name}, ${formatUnit(lumens, 'lm')}`,
              }))}
            />
            <NumberField
              name="lumens"
              label="Or as printed on its box"
              unit="lm"
              unitName="lumens"
              hint={`From ${formatNumber(LUMEN_RANGE.low)} to ${formatNumber(LUMEN_RANGE.high)}`}
              defaultValue={text('lumens')}
            />
            <NumberField
              name="distance"
              label="From bulb to page"
              unit="cm"
              unitName="centimetres"
              hint={`From ${formatNumber(DISTANCE_RANGE.low)} to ${formatNumber(DISTANCE_RANGE.high)}`}
              defaultValue={text('distance')}
            />
          </div>
          <p className="max-w-[58ch] text-note text-soft">
            Light on the page E = I/d², with I = lumens/(4π) and d in metres: a bare bulb that shines alike all round,
            straight at the page. An ordinary bulb of 470{THIN_SPACE}lm at 40{THIN_SPACE}cm gives 234{THIN_SPACE}lux. A
            shade that turns the light to the page gives more, one that hides the bulb less, so take it as half to
            twice.
          </p>
        </>,
      )}
      {form(
        'camera',
        'By a camera that shows exposure values',
        <>
          <NumberField
            name="ev"
            label="Exposure value at ISO 100, aimed at white paper"
            unit="EV"
            hint={`From ${formatNumber(CAMERA_RANGE.low)} to ${formatNumber(CAMERA_RANGE.high)}; for a reading lamp about 8 or 9`}
            defaultValue={text('ev')}
          />
          <p className="max-w-[58ch] text-note text-soft">
            E ≈ 0.46 · 2<sup>EV</sup> lux, for a meter constant K of 12.5 and paper that reflects 85{THIN_SPACE}%.
          </p>
        </>,
      )}
      <ButtonLink
        href={back}
        look="quiet"
        className="justify-self-start"
        onClick={(event) => {
          event.preventDefault()
          go(back)
        }}
      >
        Back without changing the light
      </ButtonLink>
    </div>
  )
}

function Outcome({
  estimate: { lux, low, high },
  target,
  texts,
  onUse,
}: {
  estimate: Estimate
  target: EstimateTarget
  texts: (readonly [string, string])[]
  onUse: (lux: number) => void
}) {
  return (
    <Notice>
      <p>
        <b>
          About {formatLux(lux)}
          {THIN_SPACE}lux
        </b>
        ; it may be anything from {formatLux(low)} to {formatLux(high)}
        {high / lux === BAND_FACTOR ? ', half to twice' : ''}.
      </p>
      <form
        action="/quiz"
        className="mt-3"
        onSubmit={(event) => {
          event.preventDefault()
          onUse(lux)
        }}
      >
        <HiddenFields texts={[['step', '2'], ['estimate', target], ...texts]} />
        <Button type="submit" name="use" value={lux}>
          Use it
        </Button>
      </form>
    </Notice>
  )
}

function nameOf(target: EstimateTarget, { answers }: Address): string {
  const listed = SPOTS.find(({ slug }) => slug === target)
  if (listed) return listed.name
  return answers.own[Number(target.slice('own'.length)) - 1]?.name || 'your own spot'
}
