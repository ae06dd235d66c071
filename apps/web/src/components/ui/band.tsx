import type { ReactNode } from 'react'

export type BandTone = 'note' | 'warning' | 'error' | 'good' | 'human'

const tones: Record<BandTone, string> = {
  note: 'border-l-steel bg-steel-wash',
  warning: 'border-l-ochre bg-ochre-wash',
  error: 'border-l-fault bg-fault-wash',
  good: 'border-l-verdigris bg-verdigris-wash',
  human: 'border-l-redline bg-redline-wash',
}

interface Props {
  readonly tone?: BandTone
  readonly title?: ReactNode
  readonly children?: ReactNode
  readonly actions?: ReactNode
  /** Read out when it appears. */
  readonly live?: 'status' | 'alert'
}

/** A line of text that holds for the whole sheet: read only, superseded, stale, failed. */
export const Band = ({ tone = 'note', title, children, actions, live }: Props) => (
  <div
    role={live}
    className={`flex flex-wrap items-center gap-x-4 gap-y-2 border-l-[3px] px-3 py-2 text-ink ${tones[tone]}`}
  >
    <div className="min-w-0 flex-1 basis-64">
      {title ? <p className="font-semibold">{title}</p> : null}
      {children ? <div className={title ? 'mt-0.5' : ''}>{children}</div> : null}
    </div>
    {actions ? <div className="flex flex-wrap gap-2">{actions}</div> : null}
  </div>
)
