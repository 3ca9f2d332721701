import { TextToCopy } from '@/components/text-to-copy'
import { Disclosure } from '@/components/ui/disclosure'
import { type Column, Table } from '@/components/ui/table'
import { curlLine, exampleRequest } from '@/lib/openapi/curl'
import { type Field, fieldsOf } from '@/lib/openapi/fields'
import { SCHEMAS } from '@/lib/openapi/schemas'
import type { Answer, Operation as Described, JsonSchema, Parameter } from '@/lib/openapi/types'

const PARAMETERS: readonly Column<Parameter>[] = [
  { key: 'name', head: 'Parameter', label: 'Parameter', heading: true, cell: ({ name }) => <code>{name}</code> },
  { key: 'in', head: 'Where', label: 'Where', cell: (one) => (one.in === 'path' ? 'in the path' : 'after the ?') },
  { key: 'description', head: 'What it says', label: 'What it says', cell: ({ description }) => description },
  { key: 'example', head: 'Example', label: 'Example', cell: ({ example }) => <code>{example}</code> },
]

const FIELDS: readonly Column<Field>[] = [
  {
    key: 'path',
    head: 'Field',
    label: 'Field',
    heading: true,
    cell: ({ path }) => <code className="break-all">{path}</code>,
  },
  { key: 'type', head: 'Type', label: 'Type', cell: ({ type }) => type },
  { key: 'meaning', head: 'Meaning', label: 'Meaning', cell: ({ meaning }) => meaning },
]

type Refusal = { status: string; answer: Answer }
const REFUSALS: readonly Column<Refusal>[] = [
  { key: 'status', head: 'Status', label: 'Status', heading: true, cell: ({ status }) => status },
  { key: 'what', head: 'When', label: 'When', cell: ({ answer }) => answer.description },
]

/** The fields of what a reference names. */
function fieldsAt(schema: JsonSchema | undefined): Field[] {
  const name =
    String(schema?.$ref ?? '')
      .split('/')
      .at(-1) ?? ''
  return fieldsOf(SCHEMAS[name] ?? {})
}

/** One operation of the API: what it does, what it takes, what comes back, and a line that works. */
export function OperationSection({
  path,
  method,
  operation,
  origin,
}: {
  path: string
  method: 'GET' | 'POST'
  operation: Described
  origin: string
}) {
  const { operationId, summary, description, parameters = [], requestBody, responses } = operation
  const question = fieldsAt(requestBody?.content['application/json']?.schema)
  const answer = fieldsAt(responses[200]?.content?.['application/json']?.schema)
  const refusals = Object.entries(responses).flatMap(([status, one]) =>
    status === '200' ? [] : [{ status, answer: one }],
  )
  return (
    <section
      id={operationId}
      aria-labelledby={`${operationId}-title`}
      className="mt-12 scroll-mt-4 border-t border-rule pt-8"
    >
      <h2 id={`${operationId}-title`}>{summary}</h2>
      <p className="mt-2 [overflow-wrap:anywhere]">
        <strong>{method}</strong> <code>{path}</code>
      </p>
      <p className="mt-3 max-w-[68ch]">{description}</p>
      <h3 className="mt-5">Example</h3>
      <TextToCopy label={`Example: ${summary}`} text={curlLine(exampleRequest(path, method, operation), origin)} />
      {parameters.length > 0 && (
        <Table
          className="mt-6"
          caption={`Parameters of ${method} ${path}`}
          columns={PARAMETERS}
          rows={parameters}
          rowKey={({ name }) => name}
        />
      )}
      {question.length > 0 && (
        <Disclosure summary={`Fields of the question, ${question.length}`} className="mt-4">
          <Table
            caption={`What ${method} ${path} is sent`}
            columns={FIELDS}
            rows={question}
            rowKey={({ path: one }) => one}
          />
        </Disclosure>
      )}
      {answer.length > 0 && (
        <Disclosure summary={`Fields of the answer, ${answer.length}`} className="mt-2">
          <Table
            caption={`What ${method} ${path} answers`}
            columns={FIELDS}
            rows={answer}
            rowKey={({ path: one }) => one}
          />
        </Disclosure>
      )}
      <Disclosure summary="Other answers" className="mt-2">
        <Table
          caption={`Other answers of ${method} ${path}`}
          columns={REFUSALS}
          rows={refusals}
          rowKey={({ status }) => status}
        />
      </Disclosure>
    </section>
  )
}
