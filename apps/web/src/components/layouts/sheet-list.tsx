import type { ReactNode } from 'react'
import { NavLink } from 'react-router-dom'

export interface SheetLink {
  /** Sheet number, or nothing for pages outside a project. */
  readonly number?: number
  readonly name: string
  readonly to: string
  /** A short count or word at the right: what waits on this sheet. */
  readonly badge?: ReactNode
  readonly end?: boolean
}

const Item = ({ link }: { readonly link: SheetLink }) => (
  <li className="shrink-0">
    <NavLink
      to={link.to}
      end={link.end ?? false}
      className={({ isActive }) =>
        `flex h-9 items-center gap-2 px-2.5 whitespace-nowrap no-underline bench:px-3 ${
          isActive
            ? 'bg-sheet font-semibold text-ink shadow-none border-b-[3px] border-b-steel bench:border-b-0 bench:border-l-[3px] bench:border-l-steel bench:pl-[9px]'
            : 'text-ink hover:bg-steel-wash'
        }`
      }
    >
      {link.number === undefined ? null : (
        <span aria-hidden="true" className="w-3 font-mono text-cell text-pencil">
          {link.number}
        </span>
      )}
      <span className="truncate">{link.name}</span>
      {link.badge === undefined || link.badge === null ? null : <span className="ml-auto">{link.badge}</span>}
    </NavLink>
  </li>
)

interface Props {
  readonly label: string
  readonly heading: ReactNode
  readonly sheets: readonly SheetLink[]
  readonly others: readonly SheetLink[]
}

/** Navigation by sheet numbers: a column at the left, a row on top where the window is narrow. */
export const SheetList = ({ label, heading, sheets, others }: Props) => (
  <nav
    aria-label={label}
    className="flex min-h-0 min-w-0 border-ink bg-paper max-bench:items-center max-bench:border-b-2 bench:flex-col bench:overflow-y-auto bench:border-r-2 print:hidden"
  >
    <div className="shrink-0 px-3 py-2 max-bench:py-0 bench:pt-3 bench:pb-4">{heading}</div>
    <div className="flex min-w-0 flex-1 overflow-x-auto bench:flex-col bench:overflow-x-visible">
      <ul className="flex bench:flex-col">
        {sheets.map((link) => (
          <Item key={link.to} link={link} />
        ))}
      </ul>
      <ul className="flex border-hair empty:hidden bench:mt-auto bench:flex-col bench:border-t bench:py-2">
        {others.map((link) => (
          <Item key={link.to} link={link} />
        ))}
      </ul>
    </div>
  </nav>
)
