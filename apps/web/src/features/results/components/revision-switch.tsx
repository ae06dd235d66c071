import { revisionSegment, revisionTitle, type Project } from '@coldfill/contract'
import { useAddress } from '#lib/search-params.ts'
import { stateWord } from '#lib/words.ts'

/** Which content is looked at: the working copy or a frozen revision. */
export const RevisionSwitch = ({ project }: { readonly project: Project }) => {
  const { get, change } = useAddress()
  const working = project.permissions.seeWorkingCopy.allowed
  const newest = project.revisions[0]
  const value = get('rev') ?? (working ? '' : newest ? revisionSegment(newest.label) : '')
  if (!working && project.revisions.length < 2) return null
  return (
    <label className="inline-flex items-center gap-2 text-cell print:hidden">
      <span className="font-semibold">Content</span>
      <select
        value={value}
        onChange={(event) => change({ rev: event.target.value || null, row: null, col: null })}
        className="h-8 max-w-48 border border-rule bg-sheet px-1.5 text-ink"
      >
        {working ? <option value="">Working copy</option> : null}
        {project.revisions.map((revision) => (
          <option key={revision.id} value={revisionSegment(revision.label)}>
            {revisionTitle(revision.label)} · {stateWord(revision.state)}
          </option>
        ))}
      </select>
    </label>
  )
}
