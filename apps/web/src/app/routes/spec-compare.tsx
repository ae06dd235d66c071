import type { Project } from '@coldfill/contract'
import type { UnitSystem } from '@coldfill/units'
import { useQuery } from '@tanstack/react-query'
import { useMemo } from 'react'
import { Link } from 'react-router-dom'
import { Failure } from '#components/failure.tsx'
import { GhostRows } from '#components/ui/waiting.tsx'
import { paths, withQuery } from '#config/paths.ts'
import { ResultChangesTable } from '#features/results/components/result-changes-table.tsx'
import { resultChanges } from '#features/results/result-changes.ts'
import { sizedTextQuery, specQuery } from '#features/spec/api/spec.ts'
import { compareChoices, choiceOf, otherText, type CompareWith } from '#features/spec/compare-with.ts'
import { ComparePanel } from '#features/spec/components/compare-panel.tsx'
import type { SizedText } from '#features/spec/use-sizing.ts'
import type { SpecDraft } from '#features/spec/use-spec-draft.ts'
import type { Finding } from '#lib/sized-project.ts'
import { revisionTitle, revisionLabel } from '@coldfill/contract'

interface Props {
  readonly project: Project
  readonly draft: SpecDraft
  readonly compared: CompareWith
  readonly onCompare: (compared: CompareWith | null) => void
  readonly readOnly: boolean
  readonly findings: readonly Finding[]
  readonly good: SizedText | null
  readonly units: UnitSystem
}

/** The text in the editor beside another one, and which results the difference moves. */
export const SpecCompare = ({ project, draft, compared, onCompare, readOnly, findings, good, units }: Props) => {
  const { number } = project
  const segment = compared.with === 'revision' ? compared.segment : null
  const frozen = useQuery({ ...specQuery(number, segment), enabled: segment !== null })
  const known = otherText(compared, draft)
  const left = useMemo(
    () =>
      known === undefined
        ? frozen.data && segment !== null
          ? { title: revisionTitle(revisionLabel(segment)), text: frozen.data.text }
          : null
        : known,
    // The other text is the same while its words are.
    // oxlint-disable-next-line react/exhaustive-deps
    [known?.title, known?.text, frozen.data, segment],
  )
  const sized = useQuery({ ...sizedTextQuery(number, left?.text ?? ''), enabled: left !== null && !readOnly })
  const right = useMemo(() => ({ title: 'Your text', text: draft.text }), [draft.text])
  const changes = useMemo(
    () => (sized.data && good ? resultChanges(sized.data, good.result, units) : null),
    [sized.data, good, units],
  )
  const chooser = (
    <>
      <label className="inline-flex items-center gap-2 text-cell">
        <span className="font-semibold">Beside</span>
        <select
          value={choiceOf(compared)}
          onChange={(event) => {
            const found = compareChoices(draft, project).find(({ value }) => value === event.target.value)
            if (found) onCompare(found.compared)
          }}
          className="h-7 max-w-52 border border-rule bg-sheet px-1 text-ink"
        >
          {compareChoices(draft, project).map(({ value, label }) => (
            <option key={value} value={value}>
              {label}
            </option>
          ))}
        </select>
      </label>
      {project.revisions.length > 0 ? (
        <Link className="text-cell" to={withQuery(paths.compare(number), { units: units.toLowerCase() })}>
          Any two revisions
        </Link>
      ) : null}
    </>
  )
  if (!left)
    return (
      <section aria-label="Compare" className="flex min-h-0 flex-1 flex-col gap-3 border-t-2 border-ink bg-sheet p-3">
        <Failure error={frozen.error} />
        {frozen.error ? null : <GhostRows rows={6} what="Loading the other text" />}
      </section>
    )
  return (
    <ComparePanel
      key={`${choiceOf(compared)} ${left.title}`}
      left={left}
      right={right}
      readOnly={readOnly}
      findings={findings}
      pushed={draft.pushed}
      onChange={draft.changeInComparison}
      chooser={chooser}
      onClose={() => onCompare(null)}
      results={{
        count: changes?.length ?? null,
        table:
          sized.error !== null ? (
            <Failure error={sized.error} />
          ) : changes ? (
            <ResultChangesTable changes={changes} was={left.title} now="Your text" />
          ) : (
            <p className="py-2 text-pencil">Sizing both texts…</p>
          ),
      }}
      merge={
        compared.with === 'theirs' && draft.merged
          ? { merged: draft.merged, onTakeTheirs: draft.takeTheirsAt, onKeepMine: draft.keepMineAt }
          : null
      }
    />
  )
}
