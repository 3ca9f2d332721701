import type { ExampleData } from '../data'
import { MethodSection, Prose } from '../parts'
import { WorkedExample } from '../try/worked-example'

export function ExampleSection({ number, data }: { number: number; data: ExampleData }) {
  return (
    <MethodSection id="example" number={number} title="A worked example you can change">
      <Prose>
        <p>
          Type L*, a* and b* of a page and its ink, or a list of readings, and follow every step: the formula, the same
          with your numbers in it, and where it is from. It is worked out by the code that makes our own figures.
        </p>
      </Prose>
      <WorkedExample data={data} />
    </MethodSection>
  )
}
