import type { Range } from '@coldfill/spec'
import { useCallback, useEffect, useRef, type ComponentProps } from 'react'
import { Outline } from './outline.tsx'

interface Props extends ComponentProps<typeof Outline> {
  /** Whether it is drawn out, where the screen is too narrow to show it always. */
  readonly open: boolean
  readonly onClose: () => void
}

/** Whether the outline leaves room for the text beside it. Must agree with the breakpoint `desk`. */
const isNarrow = () => !window.matchMedia('(width >= 700px)').matches

/**
 * The outline: always beside the text on a wide screen, drawn out by a button on a narrower one, over the text on a phone,
 * where it goes away once a place is chosen.
 */
export const OutlineDrawer = ({ open, onClose, onJump, ...rest }: Props) => {
  const drawer = useRef<HTMLDivElement>(null)
  useEffect(() => {
    if (open) drawer.current?.querySelector<HTMLElement>('button')?.focus()
  }, [open])
  const jump = useCallback(
    (range: Range) => {
      if (open && isNarrow()) onClose()
      onJump(range)
    },
    [open, onClose, onJump],
  )
  return (
    <div
      ref={drawer}
      id="outline"
      className={`min-h-0 shrink-0 bg-sheet max-desk:h-[55%] max-desk:border-b-2 max-desk:border-ink desk:w-58 zones:block ${open ? '' : 'hidden'}`}
      onKeyDown={(event) => {
        if (event.key !== 'Escape' || !open) return
        event.preventDefault()
        onClose()
        document.querySelector<HTMLElement>('[aria-controls=outline]')?.focus()
      }}
    >
      <Outline {...rest} onJump={jump} />
    </div>
  )
}
