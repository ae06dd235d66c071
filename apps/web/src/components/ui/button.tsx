import type { ButtonHTMLAttributes, ReactNode } from 'react'

type Look = 'main' | 'plain' | 'quiet'

const looks: Record<Look, string> = {
  main: 'border-[1.5px] border-steel bg-steel text-sheet font-semibold enabled:hover:bg-ink enabled:hover:border-ink',
  plain: 'border-[1.5px] border-rule bg-sheet text-ink font-medium hover:border-ink',
  quiet: 'border-[1.5px] border-transparent text-steel font-medium underline underline-offset-3 hover:text-ink',
}
const resting = 'border-[1.5px] border-dashed border-rule bg-transparent text-pencil font-medium'

/** The look of a button, for links that act like one. */
export const buttonClass = (look: Look = 'plain', small = false): string =>
  `inline-flex items-center justify-center gap-1.5 whitespace-nowrap no-underline print:hidden ${small ? 'h-6 px-2 text-cell' : 'h-8 px-3 text-body'} ${looks[look]}`

interface Props extends Omit<ButtonHTMLAttributes<HTMLButtonElement>, 'disabled'> {
  readonly look?: Look
  readonly small?: boolean
  /** Why the button may not be used now. It stays reachable and says so. */
  readonly why?: string | null | undefined
  /** Show the reason beside the button; otherwise it is only in its description and tooltip. */
  readonly showWhy?: boolean
  readonly busy?: boolean
  readonly children: ReactNode
}

export const Button = ({
  look = 'plain',
  small = false,
  why,
  showWhy = false,
  busy = false,
  onClick,
  children,
  className = '',
  type = 'button',
  ...rest
}: Props) => {
  const off = why !== null && why !== undefined && why !== ''
  const id = rest.id ?? undefined
  const size = small ? 'h-6 px-2 text-cell' : 'h-8 px-3 text-body'
  const button = (
    <button
      {...rest}
      type={off ? 'button' : type}
      aria-disabled={off || busy ? true : undefined}
      aria-busy={busy ? true : undefined}
      aria-description={off ? why : undefined}
      title={off ? why : rest.title}
      id={id}
      className={
        off
          ? `inline-flex items-center justify-center gap-1.5 whitespace-nowrap print:hidden ${size} ${resting} ${className}`
          : `${buttonClass(look, small)} ${busy ? 'opacity-70' : ''} ${className}`
      }
      onClick={off || busy ? (event) => event.preventDefault() : onClick}
    >
      {children}
    </button>
  )
  if (!off || !showWhy) return button
  return (
    <span className="inline-flex flex-wrap items-center gap-x-3 gap-y-1">
      {button}
      <span className="text-cell text-pencil" aria-hidden="true">
        {why}
      </span>
    </span>
  )
}
