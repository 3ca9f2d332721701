import { pgEnum } from 'drizzle-orm/pg-core'

export const obtained = pgEnum('obtained', ['bought', 'lent'])
/** page: full white after a full refresh, front light off; ink: full black. */
export const state = pgEnum('state', ['page', 'ink'])
/** Whether the mirror part of the reflection is in the reading. The two are never mixed. */
export const specularMode = pgEnum('specular_mode', ['included', 'excluded'])
export const illuminant = pgEnum('illuminant', ['D65', 'D50', 'C', 'A'])
export const observer = pgEnum('observer', ['10', '2'])
export const uvMode = pgEnum('uv_mode', ['included', 'cut', 'adjusted'])
export const controlKind = pgEnum('control_kind', ['tile', 'chart-white', 'paper'])
export const controlMoment = pgEnum('control_moment', ['start', 'end'])
export const calibrationKind = pgEnum('calibration_kind', ['white', 'zero'])
/** none: as read. flagged: stands out, and counts. left-out: does not count; the reason says why. */
export const readingFlag = pgEnum('reading_flag', ['none', 'flagged', 'left-out'])
export const stated = pgEnum('stated', ['yes', 'no', 'not-stated'])
