import { useEffect, useRef, useState, type ReactNode } from 'react'

/**
 * A box whose content may be wider than itself. Where it is, the keyboard reaches it, to scroll; where all is in sight it is no
 * stop on the way.
 */
export const Scrollable = ({
  label,
  className,
  children,
}: {
  /** What it holds. */
  readonly label: string
  readonly className: string
  readonly children: ReactNode
}) => {
  const box = useRef<HTMLDivElement>(null)
  const [scrolls, setScrolls] = useState(false)
  useEffect(() => {
    const element = box.current
    if (!element) return
    const look = () => setScrolls(element.scrollWidth > element.clientWidth)
    const observer = new ResizeObserver(look)
    observer.observe(element)
    for (const child of element.children) observer.observe(child)
    look()
    return () => observer.disconnect()
  }, [])
  return (
    <div
      ref={box}
      className={`max-w-full overflow-x-auto ${className}`}
      {...(scrolls ? { role: 'group', 'aria-label': label, tabIndex: 0 } : {})}
    >
      {children}
    </div>
  )
}
