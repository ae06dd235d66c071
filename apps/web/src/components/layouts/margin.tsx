import { useEffect, type ReactNode } from 'react'
import { createStore, useStore } from '#lib/store.ts'

/** Whether the margin is drawn out; kept while the page is open. */
export const marginOpen = createStore(typeof window === 'undefined' || window.matchMedia('(width >= 1100px)').matches)

/** Whether the sheet has a margin, for the link that skips to it. */
export const marginPresent = createStore(false)

/** The drawer at the right: trace, redlines, help of the focused thing. A sheet from below on narrow screens. */
export const Margin = ({
  title,
  children,
  onEscape,
}: {
  readonly title: string
  readonly children: ReactNode
  /** Where Escape leads from within. */
  readonly onEscape?: (() => void) | undefined
}) => {
  const open = useStore(marginOpen)
  useEffect(() => {
    marginPresent.set(true)
    return () => marginPresent.set(false)
  }, [])
  return (
    <aside
      id="margin"
      tabIndex={-1}
      aria-label={`Margin: ${title}`}
      onKeyDown={(event) => {
        if (event.key === 'Escape' && !event.defaultPrevented) onEscape?.()
      }}
      className={`flex min-h-0 min-w-0 flex-col border-ink bg-sheet max-bench:border-t-2 bench:border-l-2 print:hidden ${open ? 'max-bench:max-h-[45dvh] bench:w-[312px]' : 'bench:w-9'}`}
    >
      <div
        className={`flex shrink-0 items-center gap-2 border-hair ${open ? 'h-10 border-b px-4' : 'h-10 px-4 bench:h-auto bench:flex-col bench:px-0 bench:py-2'}`}
      >
        <h2
          className={`min-w-0 flex-1 truncate font-semibold ${open ? '' : 'bench:[writing-mode:vertical-rl] bench:flex-none'}`}
        >
          {title}
        </h2>
        <button
          type="button"
          aria-expanded={open}
          aria-label={open ? 'Close the margin' : 'Open the margin'}
          onClick={() => marginOpen.set(!open)}
          className={`flex size-6 items-center justify-center text-pencil hover:text-ink ${open ? '' : 'bench:order-first'}`}
        >
          <svg
            width="14"
            height="14"
            viewBox="0 0 14 14"
            aria-hidden="true"
            className="fill-none stroke-current"
            strokeWidth="1.8"
          >
            {open ? (
              <path className="bench:hidden" d="m2 5 5 5 5-5" />
            ) : (
              <path className="bench:hidden" d="m2 9 5-5 5 5" />
            )}
            {open ? (
              <path className="max-bench:hidden" d="m5 2 5 5-5 5" />
            ) : (
              <path className="max-bench:hidden" d="m9 2-5 5 5 5" />
            )}
          </svg>
        </button>
      </div>
      {open ? <div className="min-h-0 flex-1 overflow-y-auto px-4 py-3">{children}</div> : null}
    </aside>
  )
}
