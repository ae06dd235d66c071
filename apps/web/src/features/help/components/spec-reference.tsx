import {
  hydronicServices,
  specReference,
  type ReferenceKey,
  type ReferenceSection,
  type Vocabulary,
} from '@coldfill/spec'
import { useMemo } from 'react'
import { Prose } from '#components/ui/prose.tsx'
import { Scrollable } from '#components/ui/scrollable.tsx'
import { capital } from '#lib/format.ts'

/** Lists longer than this are folded away. */
const MOST_CHOICES = 8

const Choices = ({ choices }: { readonly choices: ReferenceKey['choices'] }) => {
  const list = (
    <ul className="mt-1 text-cell">
      {choices.map(({ name, doc }) => (
        <li key={name}>
          <code className="font-mono">{name}</code> <span className="text-pencil">{doc}</span>
        </li>
      ))}
    </ul>
  )
  return choices.length <= MOST_CHOICES ? (
    list
  ) : (
    <details>
      <summary className="cursor-pointer text-cell text-steel">{choices.length} words</summary>
      {list}
    </details>
  )
}

const LOOPS = 'closed loops of heating and cooling'

/** All closed loops are said in one word. */
const servicesWords = (services: readonly string[] | undefined): string | null => {
  if (services === undefined || services.length === 0) return null
  const loops = hydronicServices.every((service) => services.includes(service))
  const others = services.filter((service) => !loops || !hydronicServices.some((loop) => loop === service))
  return `In ${[...(loops ? [LOOPS] : []), ...others].join(', ')}.`
}

const Key = ({ entry }: { readonly entry: ReferenceKey }) => {
  const services = servicesWords(entry.services)
  return (
    <div className="grid gap-x-4 border-b border-hair py-2 desk:grid-cols-[12rem_minmax(0,1fr)]">
      <dt>
        <code className="font-mono font-semibold break-words">{entry.key}</code>
        {entry.required ? <span className="ml-2 text-cell">required</span> : null}
      </dt>
      <dd className="text-read">
        <p>
          <Prose text={entry.doc} />
        </p>
        <p className="text-cell text-pencil">
          Takes {entry.takes}
          {entry.units.length > 0 ? `: ${entry.units.join(', ')} or another unit of its kind` : ''}.
          {entry.fallback === undefined ? '' : ` Left out: ${entry.fallback}.`}
          {services === null ? '' : ` ${services}`}
          {entry.section === undefined ? null : (
            <>
              {' '}
              <a className="underline" href={`#key-${entry.section}`}>
                Its keys
              </a>
            </>
          )}
        </p>
        <p className="text-cell">
          <code className="font-mono break-words">
            {entry.key}: {entry.example}
          </code>
        </p>
        {entry.choices.length > 0 ? <Choices choices={entry.choices} /> : null}
      </dd>
    </div>
  )
}

const pathWords = ({ path }: ReferenceSection): string => path.join(' › ')

const Section = ({
  section,
  example,
}: {
  readonly section: ReferenceSection
  readonly example: string | undefined
}) => (
  <section className="mb-6">
    <h3 id={`key-${section.id}`} tabIndex={-1} className="scroll-mt-4 font-semibold">
      {capital(section.title)}
    </h3>
    <p className="font-mono text-cell text-pencil">{pathWords(section)}</p>
    <p className="text-read">
      <Prose text={section.doc} />
      {section.named === undefined ? null : (
        <span className="text-pencil">
          {' '}
          Its keys are names of your own, as <code className="font-mono">{section.named}</code>.
        </span>
      )}
    </p>
    {example === undefined ? null : (
      <Scrollable
        label="Example"
        className="mt-1 border border-hair bg-well px-3 py-2 font-mono text-[12.5px] leading-[18px]"
      >
        <pre className="w-max">{example}</pre>
      </Scrollable>
    )}
    {section.keys.length > 0 ? (
      <dl className="mt-1 border-t-2 border-ink">
        {section.keys.map((entry) => (
          <Key key={entry.key} entry={entry} />
        ))}
      </dl>
    ) : null}
  </section>
)

/** Every key of the spec, made from the model that reads it. */
export const SpecReference = ({ vocabulary }: { readonly vocabulary: Vocabulary }) => {
  const { sections, kinds } = useMemo(() => specReference(vocabulary), [vocabulary])
  const examples = useMemo(() => new Map(kinds.map(({ section, example }) => [section, example])), [kinds])
  return (
    <>
      <nav aria-label="Sections of the spec" className="mb-4 flex flex-wrap gap-x-4 gap-y-0 text-cell">
        {sections.map(({ id, title }) => (
          <a key={id} href={`#key-${id}`} className="py-1">
            {title}
          </a>
        ))}
      </nav>
      {sections.map((section) => (
        <Section key={section.id} section={section} example={examples.get(section.id)} />
      ))}
    </>
  )
}
