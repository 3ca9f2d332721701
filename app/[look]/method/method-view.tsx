import { CONTENTS, numberOf } from './contents'
import type { MethodData } from './data'
import { BudgetSection } from './sections/budget'
import { ControlsSection } from './sections/controls'
import { CriteriaSection } from './sections/criteria'
import { ExampleSection } from './sections/example'
import { FiguresSection } from './sections/figures'
import { FitSection } from './sections/fit'
import { LightSection } from './sections/light'
import { LimitsSection } from './sections/limits'
import { ReserveSection } from './sections/reserve'
import { SpotsSection } from './sections/spots'
import { UnknownsSection } from './sections/unknowns'
import { WeightsSection } from './sections/weights'
import { WordsSection } from './sections/words'

/** The Method page: the method itself, then what one can try, how sure we are, and what we do not know. */
export function MethodView({ data }: { data: MethodData }) {
  return (
    <main className="measure py-12">
      <h1>Method 1</h1>
      <p className="mt-4 max-w-[60ch] text-lead text-soft">
        We read how much light each page gives back, work out how well it reads where you read, and say how sure we are.
        Every formula and constant that makes a figure or moves a rank is here, with where it is from.
      </p>
      <p className="mt-4 max-w-[68ch]">
        The tables are made from the same constants the ranking computes with. <em>Published</em> means we could name
        where it is printed; <em>from memory</em> that we recall it and have not read it again; <em>house</em> that we
        chose it; <em>common practice</em> that the trade does it and nobody we know of wrote why.
      </p>
      <nav aria-label="On this page" className="mt-8">
        <ol start={0} className="list-inside list-decimal columns-1 md:columns-2">
          {CONTENTS.map(({ id, title }) => (
            <li key={id} className="py-1">
              <a href={`#${id}`}>{title}</a>
            </li>
          ))}
        </ol>
      </nav>
      <SpotsSection />
      <FiguresSection />
      <LightSection />
      <ReserveSection />
      <CriteriaSection />
      <WeightsSection />
      <FitSection />
      <LimitsSection />
      <ExampleSection number={numberOf('example')} data={data} />
      <BudgetSection number={numberOf('budget')} data={data} />
      <ControlsSection number={numberOf('controls')} data={data} />
      <WordsSection number={numberOf('words')} />
      <UnknownsSection number={numberOf('unknowns')} />
    </main>
  )
}
