import { useEffect, useState } from 'react'

/** Ruled ghost rows while something loads; words after a second, so that quick answers do not flicker. */
export const GhostRows = ({ rows = 6, what = 'Loading' }: { readonly rows?: number; readonly what?: string }) => {
  const [slow, setSlow] = useState(false)
  useEffect(() => {
    const timer = setTimeout(() => setSlow(true), 1000)
    return () => clearTimeout(timer)
  }, [])
  return (
    <div role="status" aria-label={what}>
      <div aria-hidden="true" className="border-t-[3px] border-ink">
        {Array.from({ length: rows }, (_, row) => (
          <div key={row} className="flex h-9 items-center gap-6 border-b border-hair">
            <span className="h-2 w-16 bg-hair" />
            <span className="h-2 flex-1 bg-hair opacity-50" />
            <span className="h-2 w-24 bg-hair opacity-70" />
          </div>
        ))}
      </div>
      {slow ? <p className="mt-2 text-pencil">{what}…</p> : null}
    </div>
  )
}
