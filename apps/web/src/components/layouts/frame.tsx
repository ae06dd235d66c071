import type { ReactNode } from 'react'
import { Band } from '#components/ui/band.tsx'
import { buttonClass } from '#components/ui/button.tsx'
import { paths } from '#config/paths.ts'
import { marginPresent } from './margin.tsx'
import { sessionEnded } from '#lib/session-ended.ts'
import { useStore } from '#lib/store.ts'

const skip =
  'sr-only focus:not-sr-only focus:fixed focus:top-1 focus:left-1 focus:z-50 focus:bg-sheet focus:px-3 focus:py-1.5 focus:border-2 focus:border-ink'

interface Props {
  /** Sheet list at the left; absent on a single sheet. */
  readonly list?: ReactNode
  /** The sheet and its margin. */
  readonly children: ReactNode
  /** Bands that hold on every sheet, above the title strip. */
  readonly tray?: ReactNode
  readonly strip: ReactNode
}

/** The frame of every screen: sheet list, sheet, margin, title strip. */
export const Frame = ({ list, children, tray, strip }: Props) => {
  const ended = useStore(sessionEnded)
  const hasMargin = useStore(marginPresent)
  return (
    <div
      className={`grid h-dvh grid-cols-[minmax(0,1fr)] grid-rows-[auto_minmax(0,1fr)_auto_auto_auto] bg-paper print:table print:h-auto print:w-full ${
        list ? 'bench:grid-cols-[176px_minmax(0,1fr)_auto]' : 'bench:grid-cols-[minmax(0,1fr)_auto]'
      } bench:grid-rows-[minmax(0,1fr)_auto_auto]`}
    >
      <nav aria-label="Skip" className="absolute">
        <a className={skip} href="#sheet">
          Skip to the sheet
        </a>
        {hasMargin ? (
          <a className={skip} href="#margin">
            Skip to the margin
          </a>
        ) : null}
        <a className={skip} href="#strip">
          Skip to the title strip
        </a>
      </nav>
      {list}
      {children}
      <div className="bench:col-span-full print:hidden">
        {ended ? (
          <Band
            tone="warning"
            live="alert"
            title="Your session has ended."
            actions={
              <a
                className={buttonClass('main')}
                href={paths.signIn(`${window.location.pathname}${window.location.search}`)}
              >
                Sign in again
              </a>
            }
          >
            What you typed is kept on this device.
          </Band>
        ) : null}
        {tray}
      </div>
      <footer
        id="strip"
        tabIndex={-1}
        aria-label="Title strip"
        className="min-w-0 border-t-[3px] border-ink bg-sheet bench:col-span-full print:table-footer-group print:break-inside-avoid"
      >
        {strip}
      </footer>
    </div>
  )
}
