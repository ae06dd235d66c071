import type { ReactNode } from 'react'
import { Scrollable } from './scrollable.tsx'

/** A plain ruled table: heavy rule over the head, medium under it, hair lines between rows. */
export const RuledTable = ({
  caption,
  head,
  children,
  className = '',
}: {
  readonly caption: string
  readonly head: ReactNode
  readonly children: ReactNode
  readonly className?: string
}) => (
  <Scrollable label={caption} className="relative">
    <table className={`w-full border-t-[3px] border-ink text-cell ${className}`}>
      <caption className="sr-only">{caption}</caption>
      <thead>{head}</thead>
      <tbody>{children}</tbody>
    </table>
  </Scrollable>
)

export const HeadCell = ({
  children,
  figures = false,
  className = '',
}: {
  readonly children?: ReactNode
  readonly figures?: boolean
  readonly className?: string
}) => (
  <th
    scope="col"
    className={`border-b-2 border-ink px-2 py-1.5 align-bottom first:pl-0 last:pr-0 ${figures ? 'text-right' : ''} ${className}`}
  >
    {children}
  </th>
)

export const Cell = ({
  children,
  figures = false,
  className = '',
}: {
  readonly children?: ReactNode
  readonly figures?: boolean
  readonly className?: string
}) => (
  <td
    className={`border-b border-hair px-2 py-2 align-top first:pl-0 last:pr-0 ${figures ? 'figures text-right' : ''} ${className}`}
  >
    {children}
  </td>
)

/** The cell that names its row. */
export const RowHead = ({
  children,
  className = '',
}: {
  readonly children: ReactNode
  readonly className?: string
}) => (
  <th scope="row" className={`border-b border-hair px-2 py-2 align-top first:pl-0 ${className}`}>
    {children}
  </th>
)
