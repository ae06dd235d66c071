import { useLayoutEffect, useRef, useState } from 'react'

/** Number of a redline thread, reversed out of a filled rectangle. */
export const Flag = ({
  number,
  state = 'open',
}: {
  readonly number: number | string
  readonly state?: 'open' | 'pending' | 'closed'
}) => (
  <span
    className={`keeps-colour inline-flex h-4 min-w-4.5 shrink-0 items-center justify-center px-1 align-middle font-mono text-[10px] leading-4 font-semibold ${
      state === 'open'
        ? 'bg-redline text-sheet'
        : state === 'pending'
          ? 'border-[1.5px] border-dashed border-redline text-redline'
          : 'border border-rule text-pencil line-through'
    }`}
  >
    <span className="sr-only">
      {state === 'pending' ? 'pending redline ' : state === 'closed' ? 'closed redline ' : 'redline '}
    </span>
    {number}
  </span>
)

/** Revision triangle beside what changed with a revision. */
export const RevisionTriangle = ({ letter }: { readonly letter: string }) => (
  <svg
    width="18"
    height="16"
    viewBox="0 0 18 16"
    role="img"
    aria-label={letter === '' ? 'changed since the last issue' : `changed in revision ${letter}`}
    className="keeps-colour inline-block shrink-0 align-middle"
  >
    <path d="M9 1.2 17 14.8 1 14.8Z" className="fill-none stroke-redline" strokeWidth="1.6" />
    <text x="9" y="13" textAnchor="middle" fontSize="9" className="fill-redline font-mono font-semibold">
      {letter || '–'}
    </text>
  </svg>
)

/** An edge of a cloud: whole arcs of about 7 px, bulging outward. */
const edge = (length: number, along: 'h' | 'v', direction: 1 | -1): string => {
  const arcs = Math.max(1, Math.round(length / 8))
  const step = (length / arcs) * direction
  const radius = Math.abs(step) / 2
  const part = along === 'h' ? `a${radius} ${radius} 0 0 1 ${step} 0` : `a${radius} ${radius} 0 0 1 0 ${step}`
  return part.repeat(arcs)
}

/** Path of a cloud around a rectangle. */
export const scallopPath = (width: number, height: number): string =>
  `M0 0${edge(width, 'h', 1)}${edge(height, 'v', 1)}${edge(width, 'h', -1)}${edge(height, 'v', -1)}Z`

/** A cloud around its positioned parent: what changed since the last issue. */
export const Scallop = () => {
  const ref = useRef<SVGSVGElement>(null)
  const [size, setSize] = useState<{ width: number; height: number } | null>(null)
  useLayoutEffect(() => {
    const parent = ref.current?.parentElement
    if (!parent) return undefined
    const measure = () => setSize({ width: parent.clientWidth - 8, height: parent.clientHeight - 8 })
    measure()
    const observer = new ResizeObserver(measure)
    observer.observe(parent)
    return () => observer.disconnect()
  }, [])
  return (
    <svg ref={ref} aria-hidden="true" className="pointer-events-none absolute inset-0 size-full overflow-visible">
      {size && size.width > 0 && size.height > 0 ? (
        <path
          d={scallopPath(size.width, size.height)}
          transform="translate(4 4)"
          className="fill-none stroke-redline"
          strokeWidth="1.5"
        />
      ) : null}
    </svg>
  )
}

/** What was and what is, in words for those who do not see the strike. */
export const WasNow = ({ was, now }: { readonly was: string; readonly now: string }) => (
  <span>
    <span className="sr-only">was </span>
    <del>{was}</del> <span className="sr-only">now </span>
    <ins className="font-semibold">{now}</ins>
  </span>
)
