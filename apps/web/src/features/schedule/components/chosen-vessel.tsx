import { findingWords } from '@coldfill/presentation'
import { formatQuantity, type Kind, type UnitSystem } from '@coldfill/units'
import { Link } from 'react-router-dom'
import { Prose } from '#components/ui/prose.tsx'
import { SeverityMark } from '#components/ui/severity-mark.tsx'
import { paths } from '#config/paths.ts'
import { capital } from '#lib/format.ts'
import type { Finding, Vessel } from '#lib/sized-project.ts'

/** Codes of what choosing from the catalogue has to say: nothing fits, ties, the next size down, a row that cannot be. */
const ofChoice = new Set(['CF-E031', 'CF-E032', 'CF-E033', 'CF-E034', 'CF-E035', 'CF-E036'])

export const choiceFindings = (findings: readonly Finding[], vessel: Vessel): readonly Finding[] =>
  findings.filter(
    ({ code, path }) => ofChoice.has(code) && (path === vessel.path || path.startsWith(`${vessel.path}.`)),
  )

type Selected = NonNullable<Vessel['selected']>

const facts = (vessel: Vessel, units: UnitSystem): readonly (readonly [string, string])[] => {
  const { selected } = vessel
  if (!selected) return []
  const said = (kind: Kind, value: number | undefined): string =>
    value === undefined ? '' : formatQuantity({ kind, value }, units)
  const together = selected.volume * selected.quantity
  const required = vessel.results['required-volume']?.value
  const final = vessel.results['final-pressure']
  return [
    [
      'Volume',
      `${said('volume', selected.volume)}${selected.quantity > 1 ? ` each, ${said('volume', together)} together` : ''}`,
    ],
    ['Over the required volume', required === undefined ? '' : said('volume', together - required)],
    ['Acceptance volume', said('volume', selected.acceptance)],
    ['Final pressure', final ? formatQuantity(final, units) : ''],
    ['Rated', `${said('gauge pressure', selected.maxPressure)}, ${said('temperature', selected.maxTemperature)}`],
    ['Stamp', selected.stamped ? 'Yes' : 'No'],
    ['Mounting', capital(selected.mounting ?? '')],
    ['Connection', selected.connection ?? ''],
    [
      'Diameter × height',
      selected.diameter !== undefined && selected.height !== undefined
        ? `${said('diameter', selected.diameter)} × ${said('diameter', selected.height)}`
        : '',
    ],
    ['Weight empty', said('mass', selected.weightEmpty)],
  ]
}

/** What lies next to the chosen row. */
const Besides = ({ selected, units }: { readonly selected: Selected; readonly units: UnitSystem }) => {
  const { nextDown, ties = [] } = selected
  const said = (value: number): string => formatQuantity({ kind: 'volume', value }, units)
  return (
    <ul className="mt-3 flex max-w-[80ch] flex-col gap-1">
      {nextDown ? (
        <li>
          Next size down: {nextDown.maker} {nextDown.model}, {said(nextDown.volume)}. It falls short by{' '}
          <strong className="figures font-semibold">{said(nextDown.short)}</strong> of {nextDown.of}.
        </li>
      ) : null}
      {ties.length > 0 ? (
        <li>Would do as well: {ties.map(({ maker, model }) => `${maker} ${model}`).join(', ')}.</li>
      ) : null}
    </ul>
  )
}

/** The row of the catalogue that was chosen, and what lies next to it. */
export const ChosenVessel = ({
  vessel,
  findings,
  units,
}: {
  readonly vessel: Vessel
  readonly findings: readonly Finding[]
  readonly units: UnitSystem
}) => {
  const { selected } = vessel
  // What the note says in the units of the project stands above in the units shown.
  const said = choiceFindings(findings, vessel).filter(
    ({ code }) => code !== 'CF-E034' || (!selected?.nextDown && !selected?.ties),
  )
  return (
    <div className="border-t-2 border-ink pt-2">
      {selected ? (
        <>
          <p className="text-read font-semibold">
            {selected.quantity > 1 ? `${selected.quantity} × ` : ''}
            {selected.maker} {selected.model}
          </p>
          <dl className="mt-2 grid gap-x-8 desk:grid-cols-2">
            {facts(vessel, units)
              .filter(([, value]) => value !== '')
              .map(([name, value]) => (
                <div key={name} className="flex items-baseline justify-between gap-4 border-b border-hair py-1.5">
                  <dt className="text-cell text-pencil">{name}</dt>
                  <dd className="figures text-right font-mono text-cell">{value}</dd>
                </div>
              ))}
          </dl>
          <Besides selected={selected} units={units} />
        </>
      ) : (
        <p className="max-w-[80ch] text-read">
          No vessel is chosen: the required values stand alone.
          {said.length === 0 ? ' The office has no catalogue, or the spec asks for none.' : ''}
        </p>
      )}
      {said.map((finding) => (
        <p key={`${finding.code} ${finding.message}`} className="mt-3 flex max-w-[80ch] items-start gap-2">
          <span className="pt-0.5">
            <SeverityMark severity={finding.severity} />
          </span>
          <span>
            <Link className="font-mono text-cell" to={paths.help(finding.code)}>
              {finding.code}
            </Link>{' '}
            <Prose text={findingWords(finding, units).message} />{' '}
            <span className="text-pencil">
              <Prose text={findingWords(finding, units).hint} />
            </span>
          </span>
        </p>
      ))}
    </div>
  )
}
