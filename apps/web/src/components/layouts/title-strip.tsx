import type { ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { Caption } from '#components/ui/heading.tsx'

export interface StripField {
  readonly caption: string
  readonly value: ReactNode
  readonly to?: string
  /** `always` stays on a phone; `wide` shows only where there is room for the whole block. */
  readonly room?: 'always' | 'desk' | 'wide'
  readonly grows?: boolean
}

const rooms = { always: 'flex', desk: 'hidden desk:flex', wide: 'hidden bench:flex' }

/** Title-block data along the bottom edge, as on a drawing. Fields are links to where they are decided. */
export const TitleStrip = ({ fields }: { readonly fields: readonly StripField[] }) => (
  <dl className="flex h-[53px] print:border-t-[3px] print:border-ink min-w-0 divide-x divide-rule">
    {fields.map((field) => (
      <div
        key={field.caption}
        className={`min-w-0 flex-col justify-center px-3 ${rooms[field.room ?? 'desk']} ${field.grows ? 'flex-1' : 'max-w-60'}`}
      >
        <dt>
          <Caption>{field.caption}</Caption>
        </dt>
        <dd className="truncate font-medium">
          {field.to ? (
            <Link to={field.to} className="text-ink no-underline hover:text-steel hover:underline">
              {field.value}
            </Link>
          ) : (
            field.value
          )}
        </dd>
      </div>
    ))}
  </dl>
)

/** Number and title of a project; on a phone the number alone. */
export const NumberAndTitle = ({ number, title }: { readonly number: string; readonly title: string }) => (
  <>
    {number} <span className="hidden desk:inline">{title}</span>
  </>
)
