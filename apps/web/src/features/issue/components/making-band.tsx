import type { Revision } from '@coldfill/contract'
import { revisionPhrase } from '#lib/words.ts'
import { Failure } from '#components/failure.tsx'
import { Band } from '#components/ui/band.tsx'
import { Button } from '#components/ui/button.tsx'
import { useAction } from '#lib/use-action.ts'
import { makeFiles } from '../api/issue.ts'

/** Stages of the files while they are made. One may leave the sheet meanwhile. */
export const MakingBand = ({ project, revision }: { readonly project: string; readonly revision: Revision }) => {
  const { busy, error, run } = useAction()
  const { making } = revision
  if (!making) return null
  if (making.problem) {
    return (
      <>
        <Band
          tone="error"
          live="alert"
          title={`The files of ${revisionPhrase(revision.label)} stopped at stage ${making.stage} of ${making.of}: ${making.name}.`}
          actions={
            <Button busy={busy} onClick={() => void run(() => makeFiles(project, revision.label))}>
              Try again from there
            </Button>
          }
        >
          {making.problem}
        </Band>
        <Failure error={error} />
      </>
    )
  }
  return (
    <Band
      live="status"
      title={`Making the files of ${revisionPhrase(revision.label)}: stage ${making.stage} of ${making.of}`}
    >
      <p>{making.name}. You may leave this sheet; the files are made all the same.</p>
      <progress
        className="mt-1 h-2 w-60 max-w-full appearance-none border border-rule bg-sheet [&::-moz-progress-bar]:bg-steel [&::-webkit-progress-bar]:bg-sheet [&::-webkit-progress-value]:bg-steel"
        max={making.of}
        value={making.stage}
        aria-label="Stages done"
      />
    </Band>
  )
}
