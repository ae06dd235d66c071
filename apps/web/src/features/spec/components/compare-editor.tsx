import { useEffect, useEffectEvent, useImperativeHandle, useRef, type Ref } from 'react'
import type { Range } from '@coldfill/spec'
import { useMedia } from '#lib/use-media.ts'
import type { Finding } from '#lib/sized-project.ts'
import { openCompare, type ComparePlace, type CompareView } from '../editor/compare-view.ts'
import { showFindings } from '../editor/finding-marks.ts'
import type { PushedText } from '../use-spec-draft.ts'

export interface CompareEditorHandle {
  readonly step: (by: 1 | -1) => void
  readonly takeLeft: () => void
  readonly jump: (side: 'left' | 'right', range: Range) => void
}

interface Side {
  readonly title: string
  readonly text: string
}

interface Props {
  readonly ref: Ref<CompareEditorHandle>
  readonly left: Side
  readonly right: Side
  readonly readOnly: boolean
  /** Width of the window from which the texts stand side by side. */
  readonly sideBySideFrom?: number
  /** What was put in place of the right text from elsewhere. */
  readonly pushed?: PushedText
  /** Of the text at the right. */
  readonly findings?: readonly Finding[]
  readonly onChange?: (text: string) => void
  readonly onPlace: (place: ComparePlace) => void
}

const NONE: readonly Finding[] = []

/** Two texts side by side, or one with the other's lines between on a narrow screen. The right one may be edited. */
export const CompareEditor = ({
  ref,
  left,
  right,
  readOnly,
  sideBySideFrom = 900,
  pushed,
  findings = NONE,
  onChange,
  onPlace,
}: Props) => {
  const holder = useRef<HTMLDivElement>(null)
  const view = useRef<CompareView | null>(null)
  const wide = useMedia(`(width >= ${sideBySideFrom}px)`)
  const changed = useEffectEvent((text: string) => onChange?.(text))
  const placed = useEffectEvent((place: ComparePlace) => onPlace(place))
  const textNow = useEffectEvent(() => right.text)
  const findingsNow = useEffectEvent(() => findings)

  useEffect(() => {
    if (!holder.current) return undefined
    const opened = openCompare({
      parent: holder.current,
      left: { title: left.title, text: left.text },
      right: { title: right.title, text: textNow() },
      wide,
      readOnly,
      onChange: (text) => changed(text),
      onPlace: (place) => placed(place),
    })
    view.current = opened
    opened.right.dispatch(showFindings(opened.right.state, findingsNow()))
    opened.start()
    return () => {
      view.current = null
      opened.destroy()
    }
  }, [left.title, left.text, right.title, wide, readOnly])
  // It opens with the text as it is now, which is newer than what was last put in.
  const known = useRef(pushed)
  useEffect(() => {
    if (known.current === pushed) return
    known.current = pushed
    if (pushed?.by === 'choice') view.current?.setRight(pushed.text)
  }, [pushed])
  useEffect(() => {
    const { current } = view
    if (current) current.right.dispatch(showFindings(current.right.state, findings))
  }, [findings])

  useImperativeHandle(
    ref,
    () => ({
      step: (by) => view.current?.step(by),
      takeLeft: () => view.current?.takeLeft(),
      jump: (side, range) => view.current?.jump(side, range),
    }),
    [],
  )

  return (
    <div className="flex min-h-0 flex-1 flex-col">
      {wide ? (
        <div className="flex shrink-0 border-b-2 border-ink text-cell font-semibold">
          <p className="min-w-0 flex-1 truncate px-3 py-1">{left.title}</p>
          <p className="min-w-0 flex-1 truncate px-3 py-1">{right.title}</p>
        </div>
      ) : (
        <p className="shrink-0 border-b-2 border-ink px-3 py-1 text-cell">
          <strong className="font-semibold">{right.title}</strong>, with the lines of{' '}
          <strong className="font-semibold">{left.title}</strong> above those that differ
        </p>
      )}
      <div ref={holder} className="relative min-h-0 flex-1 overflow-auto bg-well" />
    </div>
  )
}
