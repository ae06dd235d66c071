import { useEffect, useEffectEvent, type ReactNode, type RefObject } from 'react'
import { Button } from '#components/ui/button.tsx'
import type { ComparePlace } from '../editor/compare-view.ts'
import type { CompareEditorHandle } from './compare-editor.tsx'

interface Props {
  readonly editor: RefObject<CompareEditorHandle | null>
  readonly place: ComparePlace
  /** Before the place: what is compared. */
  readonly chooser?: ReactNode
  /** Behind the ways on. */
  readonly children?: ReactNode
}

const placeWords = ({ count, at }: ComparePlace): string => {
  if (count === 0) return 'The texts are the same.'
  if (at === 0) return `${count} ${count === 1 ? 'place differs' : 'places differ'}`
  return `Place ${at} of ${count}`
}

/** Over two compared texts: how many places differ, and the way from one to the next. */
export const CompareBar = ({ editor, place, chooser, children }: Props) => {
  const onKey = useEffectEvent((event: KeyboardEvent) => {
    if (!event.altKey || event.ctrlKey || event.metaKey) return
    if (event.code !== 'KeyN' && event.code !== 'KeyP') return
    event.preventDefault()
    editor.current?.step(event.code === 'KeyN' ? 1 : -1)
  })
  useEffect(() => {
    const listen = (event: KeyboardEvent) => onKey(event)
    window.addEventListener('keydown', listen)
    return () => window.removeEventListener('keydown', listen)
  }, [])
  const nothing = place.count === 0 ? 'Nothing differs.' : null
  return (
    <div className="flex shrink-0 flex-wrap items-center gap-x-3 gap-y-1 border-b border-hair px-3 py-1.5">
      {chooser}
      <p role="status" className="figures text-cell text-pencil">
        {placeWords(place)}
      </p>
      <span className="ml-auto flex flex-wrap gap-2">
        <Button small title="Alt+P" why={nothing} onClick={() => editor.current?.step(-1)}>
          Previous
        </Button>
        <Button small title="Alt+N" why={nothing} onClick={() => editor.current?.step(1)}>
          Next
        </Button>
        {children}
      </span>
    </div>
  )
}
