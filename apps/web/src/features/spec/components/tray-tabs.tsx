import type { ReactNode } from 'react'

interface Tab<T extends string> {
  readonly id: T
  readonly label: string
}

interface Props<T extends string> {
  readonly label: string
  readonly tabs: readonly Tab<T>[]
  /** Null while the tray is shut. */
  readonly open: T | null
  readonly onOpen: (tab: T | null) => void
  /** Beside the tabs. */
  readonly beside?: ReactNode
  readonly children: ReactNode
}

/** A tray under the text, which a second press on its tab shuts. */
export const TrayTabs = <T extends string>({ label, tabs, open, onOpen, beside, children }: Props<T>) => (
  <section
    aria-label={label}
    className={`flex min-h-0 shrink-0 flex-col border-t-2 border-ink bg-sheet ${open === null ? '' : 'h-[32%] max-h-72 min-h-40'}`}
  >
    <div className="flex min-h-9 shrink-0 flex-wrap items-center gap-x-1 border-b border-hair pr-3 pl-1">
      <div role="tablist" aria-label={label} className="flex">
        {tabs.map(({ id, label: name }) => (
          <button
            key={id}
            type="button"
            role="tab"
            id={`tab-${id}`}
            aria-selected={open === id}
            aria-controls="tray-panel"
            onClick={() => onOpen(open === id ? null : id)}
            className={`h-9 px-3 whitespace-nowrap ${open === id ? 'border-b-[3px] border-b-steel font-semibold' : 'text-pencil hover:text-ink'}`}
          >
            {name}
          </button>
        ))}
      </div>
      {beside}
    </div>
    {open === null ? null : (
      <div
        id="tray-panel"
        role="tabpanel"
        aria-labelledby={`tab-${open}`}
        tabIndex={0}
        className="min-h-0 flex-1 overflow-y-auto outline-offset-[-3px]"
      >
        {children}
      </div>
    )}
  </section>
)
