import { Band } from '#components/ui/band.tsx'
import { Button } from '#components/ui/button.tsx'
import { plural } from '#lib/format.ts'
import type { SpecDraft } from '../use-spec-draft.ts'

/** What came of a merge by path: how much was taken, and how much is left to choose. */
export const MergeBand = ({
  draft,
  onCompare,
}: {
  readonly draft: SpecDraft
  /** Null while both texts stand beside each other already. */
  readonly onCompare: (() => void) | null
}) => {
  const { merged } = draft
  if (!merged) return null
  const { theirs, taken, conflicts } = merged
  const left = conflicts.length
  return (
    <Band
      tone={left > 0 ? 'warning' : 'good'}
      live="status"
      title={`Merged with version ${theirs.version}${taken === null ? '' : `: ${plural(taken, 'change')} of theirs ${taken === 1 ? 'is' : 'are'} in the text`}.`}
      actions={
        <>
          {onCompare ? <Button onClick={onCompare}>Compare both</Button> : null}
          <Button onClick={draft.endMerge}>{left > 0 ? 'Keep mine in the rest' : 'Done'}</Button>
        </>
      }
    >
      {left === 0 ? 'Nothing is left that both changed.' : `${plural(left, 'place')} changed by both: choose each.`}{' '}
      <span className="max-desk:sr-only">Your text from before the merge is kept on this device until you save.</span>
    </Band>
  )
}
