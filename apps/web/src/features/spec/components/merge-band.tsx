import { Band } from '#components/ui/band.tsx'
import { Button } from '#components/ui/button.tsx'
import { plural } from '#lib/format.ts'
import type { useSpecDraft } from '../use-spec-draft.ts'

const Value = ({ title, text }: { readonly title: string; readonly text: string | null }) => (
  <span className="min-w-0">
    <span className="text-pencil">{title} </span>
    <code className="font-mono break-words">{text ?? 'nothing'}</code>
  </span>
)

/** What came of a merge by path: how much was taken, and each place that both changed, with both values until one is chosen. */
export const MergeBand = ({ draft }: { readonly draft: ReturnType<typeof useSpecDraft> }) => {
  const { merged } = draft
  if (!merged) return null
  const { version, taken, conflicts } = merged
  return (
    <Band
      tone={conflicts.length > 0 ? 'warning' : 'good'}
      live="status"
      title={`Merged with version ${version}: ${plural(taken, 'change')} of theirs ${taken === 1 ? 'is' : 'are'} in the text.`}
      actions={<Button onClick={draft.endMerge}>{conflicts.length > 0 ? 'Keep mine in the rest' : 'Done'}</Button>}
    >
      {conflicts.length === 0 ? (
        'Nothing was changed by both. Your text from before is kept on this device until you throw it away.'
      ) : (
        <ul>
          {conflicts.map((conflict) => (
            <li key={conflict.path} className="flex flex-wrap items-baseline gap-x-4 gap-y-1 py-0.5">
              <code className="font-mono font-semibold break-words">{conflict.path}</code>
              <Value title="yours" text={conflict.mine} />
              <Value title="theirs" text={conflict.theirs} />
              <Button small onClick={() => draft.takeTheirsAt(conflict.path)}>
                Take theirs
              </Button>
            </li>
          ))}
        </ul>
      )}
    </Band>
  )
}
