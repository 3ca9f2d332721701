import Link from 'next/link'
import { Changes } from '@/components/result/changes'
import { InYourLight } from '@/components/result/in-your-light'
import { groupTies } from '@/lib/method/groups'
import type { Result } from '@/lib/quiz/result'
import { FinePrint } from './fine-print'
import { Notices } from './notices'
import { Points } from './points'
import { Verdict } from './verdict'

/** Rows of the table on one numbered page; fewer in the paper theme, where pages stand in for any long scroll. */
const PER_PAGE = { paper: 6, display: 8 }
/** As few more than a page are not worth a second one. */
const NEARLY_A_PAGE = 2

/** The ranking for one reader: the verdict and why, the points, the light, and what would change it. */
export function Answer({ result, page, paper }: { result: Result; page: number | 'all'; paper: boolean }) {
  const readable = result.match.ranked.filter(({ unreadable }) => unreadable < 1)
  const groups = groupTies(readable)
  const perPage = paper ? PER_PAGE.paper : PER_PAGE.display
  const paging = page === 'all' || readable.length <= perPage + NEARLY_A_PAGE ? null : { page, perPage }
  return (
    <main>
      <Verdict result={result} ranked={readable} group={groups[0] ?? []} />
      <div className="measure grid gap-12 pt-10 print:gap-2 print:pt-2">
        <Notices result={result} />
        <Points result={result} groups={groups} paging={paging} />
        <div className="later grid gap-x-12 gap-y-10 lg:grid-cols-[minmax(0,1.45fr)_minmax(0,1fr)] print:block">
          <InYourLight result={result} ranked={readable} />
          <Changes result={result} />
        </div>
        <FinePrint result={result} />
        <p className="print:hidden">
          <Link href="/method">How the fit is computed</Link>
        </p>
      </div>
    </main>
  )
}
