import type { ReviewCopy as Copy } from '@coldfill/contract'
import { useQuery } from '@tanstack/react-query'
import { Failure } from '#components/failure.tsx'
import { Band } from '#components/ui/band.tsx'
import { Button, buttonClass } from '#components/ui/button.tsx'
import { clock, fileSize, plural } from '#lib/format.ts'
import { useAction } from '#lib/use-action.ts'
import { revisionPhrase } from '#lib/words.ts'
import { prepareReviewCopy, reviewCopyQuery } from '../api/review-copy.ts'

const Ready = ({ copy, again }: { readonly copy: Copy; readonly again: React.ReactNode }) => {
  const { file } = copy
  if (!file) return null
  return (
    <div className="border-y border-hair py-2.5">
      <div className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2">
        <div className="min-w-0">
          <p className="font-semibold break-words">{file.name}</p>
          <p className="text-cell text-pencil">
            {plural(file.redlines, 'redline')} as of <span className="figures">{clock(copy.askedAt)}</span>, asked for
            by {copy.askedBy} · <span className="figures">{fileSize(file.size)}</span>
          </p>
        </div>
        <div className="flex flex-wrap gap-2">
          {again}
          <a
            href={file.href}
            download={file.name}
            aria-label={`Download ${file.name}`}
            className={buttonClass('plain')}
          >
            Download
          </a>
        </div>
      </div>
      <p className="mt-1 font-mono text-zone break-all text-pencil">SHA-256 {file.sha256}</p>
    </div>
  )
}

/** The submittal of a revision with its redlines as comments of a word processor, prepared when it is asked for. */
export const ReviewCopy = ({ project, label }: { readonly project: string; readonly label: string }) => {
  const { data: copy = null } = useQuery(reviewCopyQuery(project, label))
  const { busy, error, run } = useAction()
  const prepare = () => void run(() => prepareReviewCopy(project, label))
  const button = (words: string) => (
    <Button busy={busy} onClick={prepare}>
      {words}
    </Button>
  )
  return (
    <div className="flex flex-col gap-2">
      <p className="max-w-[80ch] text-pencil">
        The submittal of {revisionPhrase(label)} as a document, each redline a comment at its row with its answers
        below. Pending redlines and those for the office only are left out.
      </p>
      {copy === null ? <div>{button('Prepare a review copy')}</div> : null}
      {copy?.state === 'preparing' ? (
        <Band live="status" title="Preparing the review copy">
          You may leave this sheet; it is prepared all the same.
        </Band>
      ) : null}
      {copy?.state === 'failed' ? (
        <Band tone="error" live="alert" title="The review copy could not be made." actions={button('Try again')}>
          {copy.problem}
        </Band>
      ) : null}
      {copy?.state === 'ready' ? <Ready copy={copy} again={button('Prepare it anew')} /> : null}
      <Failure error={error} />
    </div>
  )
}
