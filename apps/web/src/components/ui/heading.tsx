import type { ReactNode } from 'react'

/** Heading of a section of a sheet. */
export const SectionHeading = ({
  children,
  id,
  note,
}: {
  readonly children: ReactNode
  readonly id?: string
  readonly note?: ReactNode
}) => (
  <div className="mb-2 flex flex-wrap items-baseline justify-between gap-x-4">
    <h2 id={id} className="text-lead font-semibold">
      {children}
    </h2>
    {note ? <p className="text-cell text-pencil">{note}</p> : null}
  </div>
)

/** Caption of a title-block field: the only upper case beside marks and zone letters. */
export const Caption = ({ children }: { readonly children: ReactNode }) => (
  <span className="block font-mono text-zone font-medium tracking-wide text-pencil uppercase">{children}</span>
)
