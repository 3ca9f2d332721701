'use client'

import { LazyMotion, MotionConfig } from 'framer-motion'
import { useMemo } from 'react'
import { Lamp } from '@/components/lamp'
import { LightControl } from '@/components/light-control'
import { motionWhenUsed } from '@/components/motion-when-used'
import { Notice } from '@/components/ui/notice'
import { useLight } from '@/components/use-light'
import { formatLux, formatNumber } from '@/lib/format/number'
import { nearestLevel } from '@/lib/lamp/levels'
import { FRONT_LIGHT_BELOW_LUX } from '@/lib/lamp/question'
import { gloomOfPaper, type LampDevice, rankUnderLamp } from '@/lib/lamp/ranking'
import type { Lab } from '@/lib/method/types'
import { BoothRow } from './booth-row'
import { useStillness } from './use-stillness'

/** The home page in one light. */
const hrefFor = (lux: number) => `?lux=${lux}`

/** How many pages stand in the booth. */
const STANDING = 5

/**
 * The lamp, the pages under it in the order of their fit, and the control of its light. Ranked by the method's own code,
 * on the server for the first picture and in the browser from then on; the light is kept in the address.
 */
export function LampStage({
  devices,
  paper,
  openingLux,
}: {
  devices: readonly LampDevice[]
  paper: Lab
  openingLux: number
}) {
  const [lux, setLux] = useLight(openingLux, hrefFor)
  const still = useStillness()
  const rows = useMemo(() => rankUnderLamp(devices, lux), [devices, lux])
  const readable = rows.some((row) => row.readable)

  return (
    <LazyMotion features={motionWhenUsed} strict>
      <MotionConfig reducedMotion="user" transition={{ duration: still ? 0 : 0.2 }}>
        <div className="relative grid min-w-0 content-end gap-5 sm:pt-60">
          <Lamp lux={lux} />
          <BoothRow rows={rows.slice(0, STANDING)} paper={paper} paperGloom={gloomOfPaper(paper, lux)} still={still} />
          <div className="relative grid gap-3">
            <LightControl action="/" lux={lux} hrefFor={hrefFor} onChange={setLux}>
              <p role="status" className="text-brass-lit">
                {nearestLevel(lux).name}, about {formatLux(lux)} lux:{' '}
                {readable
                  ? `the ${formatNumber(Math.min(STANDING, rows.length))} closest fits of ${formatNumber(rows.length)} devices.`
                  : 'none of these pages can be read.'}
              </p>
            </LightControl>
            <p className="text-note text-soft">
              Fit, 0 to 100, for a reader of mostly novels who holds the device in two hands and minds all four things
              alike; a front light is used under {formatNumber(FRONT_LIGHT_BELOW_LUX)} lux. A few points apart may be
              too close to call: the quiz shows the doubts. The strip beside each page is our control paper. Colours and
              the dark are approximate on your display.
            </p>
            {!readable && (
              <Notice look="warning">
                With this little light and no front light, nobody could read any of these pages. Turn the lamp up.
              </Notice>
            )}
          </div>
        </div>
      </MotionConfig>
    </LazyMotion>
  )
}
