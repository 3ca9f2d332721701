import { Notice } from '@/components/ui/notice'
import { workOut } from '@/lib/workings/workings'
import type { ExampleData } from '../data'
import { parseExample } from './example'
import type { Texts } from './fields'
import { LiveExample } from './live-example'
import { ShortView } from './short-view'
import { StartFrom } from './start-from'
import { WorkingsView } from './workings-view'

/**
 * The worked example: where it starts from, the form, what comes out.
 * @param texts as an address gives them; the start's own where there is none
 */
export function WorkedExample({ data: { bench, start, devices }, texts }: { data: ExampleData; texts?: Texts }) {
  const filled = texts ?? start.texts
  const { example, problems } = parseExample(filled)
  const workings = example && workOut(example, bench)
  return (
    <>
      <StartFrom devices={devices} start={start} />
      <LiveExample
        opening={filled}
        problems={problems}
        bench={bench}
        ownAddress={texts !== undefined}
        short={
          workings ? <ShortView workings={workings} /> : <Notice look="warning">Nothing is worked out yet.</Notice>
        }
        workings={workings && <WorkingsView workings={workings} />}
      />
    </>
  )
}
