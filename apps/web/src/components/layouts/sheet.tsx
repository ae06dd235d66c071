import { useEffect, type ReactNode } from 'react'
import { Margin } from './margin.tsx'

interface Props {
  readonly title: string
  /** Title of the browser tab, where it says more than the heading. */
  readonly tab?: string
  /** Beside the heading: switches and buttons of the sheet. */
  readonly actions?: ReactNode
  /** Under the heading: bands. */
  readonly bands?: ReactNode
  /** Fills the height and scrolls inside itself, as an editor does. */
  readonly fills?: boolean
  readonly margin?: { readonly title: string; readonly content: ReactNode; readonly onEscape?: () => void }
  readonly children: ReactNode
}

const numerals = ['1', '2', '3', '4', '5', '6', '7', '8']
const letters = ['A', 'B', 'C', 'D', 'E', 'F']

/** Border zones of a drawing, on wide screens only. They say nothing and are no addresses. */
const Zones = ({ side }: { readonly side: 'top' | 'left' }) => (
  <div
    aria-hidden="true"
    className={`hidden justify-around font-mono text-zone font-medium text-pencil zones:flex print:hidden ${side === 'top' ? 'h-[18px] pl-[18px]' : 'w-[18px] shrink-0 flex-col items-center'}`}
  >
    {(side === 'top' ? numerals : letters).map((mark) => (
      <span key={mark}>{mark}</span>
    ))}
  </div>
)

/** One sheet: heading, content, and the margin beside it. */
export const Sheet = ({ title, tab, actions, bands, fills = false, margin, children }: Props) => {
  useEffect(() => {
    document.title = `${tab ?? title} · Coldfill`
  }, [tab, title])
  return (
    <>
      <main
        id="sheet"
        tabIndex={-1}
        className="flex min-h-0 min-w-0 flex-col outline-none zones:pr-2 zones:pb-2 print:table-row-group"
      >
        <Zones side="top" />
        <div className="flex min-h-0 min-w-0 flex-1 print:block">
          <Zones side="left" />
          <div
            className={`min-h-0 min-w-0 flex-1 bg-sheet zones:border-2 zones:border-ink print:border-0 ${fills ? 'flex flex-col' : 'overflow-y-auto print:overflow-visible'}`}
          >
            <div
              className={`flex shrink-0 flex-wrap items-center justify-between gap-x-6 gap-y-2 px-4 pt-4 pb-3 desk:px-6 ${fills ? 'desk:pt-3 desk:pb-2' : 'desk:pt-5'}`}
            >
              <h1 className="text-title font-title">{title}</h1>
              {actions ? <div className="flex flex-wrap items-center gap-2 print:hidden">{actions}</div> : null}
            </div>
            {bands ? <div className="flex shrink-0 flex-col gap-2 px-4 pb-3 desk:px-6">{bands}</div> : null}
            <div className={fills ? 'flex min-h-0 flex-1 flex-col' : 'px-4 pb-10 desk:px-6'}>{children}</div>
          </div>
        </div>
      </main>
      {margin ? (
        <Margin title={margin.title} onEscape={margin.onEscape}>
          {margin.content}
        </Margin>
      ) : null}
    </>
  )
}
