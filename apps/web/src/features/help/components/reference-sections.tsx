import type { Reference } from '@coldfill/contract'
import { Link } from 'react-router-dom'
import { SectionHeading } from '#components/ui/heading.tsx'
import { Prose } from '#components/ui/prose.tsx'
import { SeverityMark } from '#components/ui/severity-mark.tsx'
import { paths } from '#config/paths.ts'
import { capital } from '#lib/format.ts'
import { citationWords } from '#lib/sized-project.ts'

import { CodeExample } from './code-example.tsx'
import { KeyboardList } from './keyboard-list.tsx'
import { SpecReference } from './spec-reference.tsx'

const layers = ['syntax', 'spec', 'engineering'] as const

const Codes = ({ reference, here }: { readonly reference: Reference; readonly here: string }) => (
  <>
    {layers.map((layer) => {
      const codes = Object.entries(reference.findingCodes).filter(([, code]) => code.layer === layer)
      if (codes.length === 0) return null
      return (
        <div key={layer} className="mb-5">
          <h3 className="mb-1 font-semibold">{capital(layer)}</h3>
          <dl className="border-t-2 border-ink">
            {codes.map(([id, code]) => (
              <div
                key={id}
                id={id}
                tabIndex={-1}
                className={`grid scroll-mt-4 gap-x-4 border-b border-hair py-2 desk:grid-cols-[7rem_minmax(0,1fr)] ${id === here ? 'bg-steel-wash' : ''}`}
              >
                <dt className="flex items-start gap-2 font-mono text-cell">
                  <SeverityMark severity={code.severity} />
                  {id}
                </dt>
                <dd>
                  <p className="font-semibold">{code.title}</p>
                  <p className="text-read">
                    <Prose text={code.what} />
                  </p>
                  <p className="text-read text-pencil">
                    <Prose text={code.why} />
                  </p>
                  <p className="text-read">
                    <Prose text={code.fix} />
                  </p>
                  <CodeExample code={id} />
                </dd>
              </div>
            ))}
          </dl>
        </div>
      )
    })}
  </>
)

const Assumptions = ({ reference }: { readonly reference: Reference }) => (
  <dl className="border-t-2 border-ink">
    {Object.values(reference.assumptions).map((assumption) => (
      <div
        key={assumption.id}
        id={assumption.id}
        tabIndex={-1}
        className="grid scroll-mt-4 gap-x-4 border-b border-hair py-2 desk:grid-cols-[minmax(0,1fr)_9rem]"
      >
        <dt>
          <span className="font-semibold">{capital(assumption.name)}</span>
          <span className="block font-mono text-cell break-words text-pencil">{assumption.id}</span>
        </dt>
        <dd className="figures font-mono desk:text-right">{assumption.value}</dd>
        <dd className="max-w-[80ch] desk:col-span-full">
          <p className="text-read">{assumption.because}</p>
          <p className="text-cell text-pencil">{citationWords(assumption.source, reference.sources)}</p>
        </dd>
      </div>
    ))}
  </dl>
)

const Methods = ({ reference }: { readonly reference: Reference }) => (
  <dl className="border-t-2 border-ink">
    {Object.values(reference.methods)
      .filter((method) => method.vessel !== null)
      .map((method) => (
        <div key={method.id} id={method.id} tabIndex={-1} className="scroll-mt-4 border-b border-hair py-2">
          <dt className="font-semibold">
            {method.title}{' '}
            <span className="font-normal text-pencil">
              {method.vessel ? `${method.vessel.kind}, method ${method.vessel.method}` : ''}
            </span>
          </dt>
          <dd className="max-w-[80ch] text-read">{method.basis}</dd>
          <dd>
            <details>
              <summary className="cursor-pointer text-cell text-steel">Steps and sources</summary>
              <ol className="mt-1">
                {method.steps.map((step) => (
                  <li
                    key={step.symbol}
                    className="grid gap-x-4 border-t border-hair py-1 text-cell desk:grid-cols-[14rem_minmax(0,1fr)]"
                  >
                    <span>{capital(step.name)}</span>
                    <span>
                      <code className="font-mono break-words">
                        {step.symbol} = {step.formula}
                      </code>
                      <span className="block text-pencil">{citationWords(step.source, reference.sources)}</span>
                    </span>
                  </li>
                ))}
              </ol>
            </details>
          </dd>
        </div>
      ))}
  </dl>
)

const sections = [
  { id: 'spec', title: 'Spec' },
  { id: 'keyboard', title: 'Keyboard' },
  { id: 'findings', title: 'Findings' },
  { id: 'methods', title: 'Methods' },
  { id: 'assumptions', title: 'Assumptions' },
  { id: 'sources', title: 'Sources' },
]

/** What the program knows, as it knows it: generated from the same data that sizes. */
export const ReferenceSections = ({ reference, here }: { readonly reference: Reference; readonly here: string }) => (
  <div className="flex max-w-4xl flex-col gap-8">
    <nav aria-label="On this page" className="flex flex-wrap gap-x-5 gap-y-1">
      {sections.map(({ id, title }) => (
        <a key={id} href={`#${id}`}>
          {title}
        </a>
      ))}
      <Link to={paths.verification()}>Verification</Link>
      <a href="/schema/coldfill-1.json">JSON Schema of the spec</a>
    </nav>
    <section id="spec" tabIndex={-1} className="scroll-mt-4">
      <SectionHeading note="Every key, with an example for each kind of vessel">Spec</SectionHeading>
      <SpecReference vocabulary={reference.vocabulary} />
    </section>
    <section id="keyboard" tabIndex={-1} className="scroll-mt-4">
      <SectionHeading note="In the spec editor; on a Mac, Cmd for Ctrl">Keyboard</SectionHeading>
      <KeyboardList />
    </section>
    <section id="findings" tabIndex={-1} className="scroll-mt-4">
      <SectionHeading note="Accept a warning in the text: # coldfill: accept CODE because …">Findings</SectionHeading>
      <Codes reference={reference} here={here} />
    </section>
    <section id="methods" tabIndex={-1} className="scroll-mt-4">
      <SectionHeading note={`Engine ${reference.engine}`}>Methods</SectionHeading>
      <Methods reference={reference} />
    </section>
    <section id="assumptions" tabIndex={-1} className="scroll-mt-4">
      <SectionHeading>Assumptions</SectionHeading>
      <Assumptions reference={reference} />
    </section>
    <section id="sources" tabIndex={-1} className="scroll-mt-4">
      <SectionHeading>Sources</SectionHeading>
      <ul className="border-t-2 border-ink">
        {Object.values(reference.sources).map((source) => (
          <li key={source.id} className="border-b border-hair py-1.5 text-read">
            {[
              source.title,
              source.publisher,
              source.edition,
              source.year === null || source.edition.includes(String(source.year)) ? '' : String(source.year),
            ]
              .filter(Boolean)
              .join(', ')}
          </li>
        ))}
      </ul>
    </section>
  </div>
)
