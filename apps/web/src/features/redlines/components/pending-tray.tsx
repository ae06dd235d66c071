import type { Redline } from '@coldfill/contract'
import { Link } from 'react-router-dom'
import { buttonClass } from '#components/ui/button.tsx'
import { paths } from '#config/paths.ts'
import { plural } from '#lib/format.ts'

/** On every sheet while redlines wait to be sent, so that none is forgotten. */
export const PendingTray = ({
  project,
  redlines,
}: {
  readonly project: string
  readonly redlines: readonly Redline[]
}) => {
  const pending = redlines.filter((redline) => redline.state === 'pending')
  if (pending.length === 0) return null
  return (
    <div className="flex flex-wrap items-center justify-between gap-x-4 gap-y-1 border-t-2 border-redline bg-redline-wash px-4 py-1.5">
      <p>
        <strong className="font-semibold">{plural(pending.length, 'redline')} pending.</strong> Nobody else sees{' '}
        {pending.length === 1 ? 'it' : 'them'} until you send the review.
      </p>
      <Link to={paths.redlines(project)} className={buttonClass('plain', true)}>
        Go to redlines
      </Link>
    </div>
  )
}
