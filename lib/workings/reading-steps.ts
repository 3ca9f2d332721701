import { formatExact, formatNumber as n } from '@/lib/format/number'
import type { Lab } from '@/lib/method/types'
import { squaresAboutMean } from '@/lib/stats/describe'
import { GRUBBS_ALPHA } from '@/lib/stats/grubbs'
import type { ChannelStatistics } from './readings'
import type { Step } from './step'

/** More readings than this are not all written out in a sum. */
const WRITTEN_OUT = 10

/** Mean, spread and Grubbs' test of the lightness of one state's readings, step by step. */
export function readingSteps(readings: readonly Lab[], { mean, sd, halfWidth, grubbs }: ChannelStatistics): Step[] {
  const values = readings.map(({ L }) => L)
  const count = values.length
  const listed = values.slice(0, WRITTEN_OUT).map((value) => formatExact(value))
  const sum = [...listed, ...(count > WRITTEN_OUT ? ['…'] : [])].join(' + ')
  const steps: Step[] = [
    {
      id: 'mean',
      name: 'Mean of the readings’ L*',
      formula: 'mean = Σxᵢ/n',
      worked: count === 1 ? `mean = ${sum}` : `mean = (${sum})/${count}`,
      result: `L* ${n(mean, 3)}`,
      source: 'JCGM 100:2008, 4.2.1',
    },
  ]
  if (sd === null || halfWidth === null) {
    return [
      ...steps,
      {
        id: 'spread',
        name: 'Spread of the readings',
        formula: 's = √(Σ(xᵢ − mean)²/(n − 1))',
        worked: 'n is 1',
        result: 'One reading says nothing about spread',
        source: 'JCGM 100:2008, 4.2.2',
      },
    ]
  }
  steps.push(
    {
      id: 'spread',
      name: 'Standard deviation of the readings',
      formula: 's = √(Σ(xᵢ − mean)²/(n − 1))',
      worked: `s = √(${n(squaresAboutMean(values), 5)}/${count - 1})`,
      result: `s ${n(sd, 4)}`,
      source: 'JCGM 100:2008, 4.2.2',
    },
    {
      id: 'half-width',
      name: 'What the bench shows while measuring',
      formula: 't·s/√n, t of Student at 95 % with n − 1 degrees of freedom',
      worked: sd === 0 ? 's is 0' : `${n((halfWidth * Math.sqrt(count)) / sd, 3)}·${n(sd, 4)}/√${count}`,
      result: `± ${n(halfWidth, 3)}`,
      source: 'JCGM 100:2008, G.3',
      note: sd === 0 ? 'All readings are the same: they agree, which does not make them right.' : undefined,
    },
  )
  return [...steps, grubbsStep(values, mean, sd, grubbs)]
}

function grubbsStep(
  values: readonly number[],
  mean: number,
  sd: number,
  { G, critical, index, isOutlier, reason }: ChannelStatistics['grubbs'],
): Step {
  const common = {
    id: 'grubbs',
    name: 'Grubbs’ test for one reading that stands out',
    formula: `G = max|xᵢ − mean|/s, flagged above the critical value of n readings at α = ${formatExact(GRUBBS_ALPHA)}, two-sided`,
    source: 'Grubbs & Beck 1972, Technometrics 14(4)',
  }
  if (reason !== null) {
    const why = reason === 'too-few' ? 'Fewer than four readings: no test' : 'All readings are the same: no test'
    return { ...common, worked: `n is ${values.length}, s is ${n(sd, 4)}`, result: why }
  }
  return {
    ...common,
    worked: `G = |${formatExact(values[index]!)} − ${n(mean, 3)}|/${n(sd, 4)}`,
    result: `G ${n(G, 3)}, critical ${n(critical, 3)}: ${isOutlier ? `reading ${index + 1} stands out` : 'no reading stands out'}`,
    note: isOutlier ? 'A flag for a person to look at, never a deletion: the mean above still counts it.' : undefined,
  }
}
