import { pathRange, type MergeChange } from '@coldfill/spec'
import { useRef, useState, type ReactNode } from 'react'
import { Button } from '#components/ui/button.tsx'
import type { Finding } from '#lib/sized-project.ts'
import type { ComparedText } from '../compare-with.ts'
import type { ComparePlace } from '../editor/compare-view.ts'
import type { MergedText, PushedText } from '../use-spec-draft.ts'
import { CompareBar } from './compare-bar.tsx'
import { CompareEditor, type CompareEditorHandle } from './compare-editor.tsx'
import { ConflictList } from './conflict-list.tsx'
import { TrayTabs } from './tray-tabs.tsx'

interface Props {
  readonly left: ComparedText
  readonly right: ComparedText
  readonly readOnly: boolean
  readonly pushed?: PushedText
  readonly findings?: readonly Finding[]
  readonly onChange?: (text: string) => void
  /** Chooses what stands at the left. */
  readonly chooser?: ReactNode
  readonly onClose?: () => void
  /** Which results are not the same; `count` is null while they are worked out. */
  readonly results: { readonly count: number | null; readonly table: ReactNode }
  readonly merge?: {
    readonly merged: MergedText
    readonly onTakeTheirs: (path: string) => boolean
    readonly onKeepMine: (path: string) => void
  } | null
}

type Tab = 'conflicts' | 'differing'

/** Two texts beside each other: a way through what differs, the lines of the other taken one by one, and which results moved. */
export const ComparePanel = ({
  left,
  right,
  readOnly,
  pushed,
  findings,
  onChange,
  chooser,
  onClose,
  results,
  merge = null,
}: Props) => {
  const editor = useRef<CompareEditorHandle>(null)
  const [place, setPlace] = useState<ComparePlace>({ count: 0, at: 0 })
  const conflicts = merge?.merged.conflicts
  const [tab, setTab] = useState<Tab | null>('differing')
  // The places to choose come to the front when there are some.
  const [asked, setAsked] = useState(false)
  if (asked !== Boolean(conflicts?.length)) {
    setAsked(Boolean(conflicts?.length))
    setTab(conflicts?.length ? 'conflicts' : 'differing')
  }

  const jump = ({ path }: MergeChange) => {
    const theirs = pathRange(left.text, path)
    const mine = pathRange(right.text, path)
    if (theirs) editor.current?.jump('left', theirs)
    else if (mine) editor.current?.jump('right', mine)
  }
  return (
    <section aria-label="Compare" className="flex min-h-0 flex-1 flex-col border-t-2 border-ink bg-sheet">
      <CompareBar editor={editor} place={place} chooser={chooser}>
        {readOnly ? null : (
          <Button
            small
            title={`Take this from ${left.title}`}
            why={place.at === 0 ? 'The cursor stands at no place that differs.' : null}
            onClick={() => editor.current?.takeLeft()}
          >
            Take the other here
          </Button>
        )}
        {onClose ? (
          <Button small onClick={onClose}>
            Close
          </Button>
        ) : null}
      </CompareBar>
      <CompareEditor
        ref={editor}
        left={left}
        right={right}
        readOnly={readOnly}
        onPlace={setPlace}
        {...(pushed && { pushed })}
        {...(findings && { findings })}
        {...(onChange && { onChange })}
      />
      <TrayTabs
        label="What differs"
        tabs={[
          ...(merge ? [{ id: 'conflicts' as const, label: `Changed by both ${conflicts?.length ?? 0}` }] : []),
          { id: 'differing' as const, label: `Results that moved ${results.count ?? '…'}` },
        ]}
        open={tab}
        onOpen={setTab}
      >
        {tab === 'conflicts' && merge ? (
          <ConflictList
            conflicts={merge.merged.conflicts}
            onJump={jump}
            onTakeTheirs={merge.onTakeTheirs}
            onKeepMine={merge.onKeepMine}
          />
        ) : (
          <div className="px-3 pb-2">{results.table}</div>
        )}
      </TrayTabs>
    </section>
  )
}
