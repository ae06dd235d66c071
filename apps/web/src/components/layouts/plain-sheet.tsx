import { useEffect, type ReactNode } from 'react'

/** A single sheet on the desk, in the proportion of A5: sign in, not found. */
export const PlainSheet = ({ title, children }: { readonly title: string; readonly children: ReactNode }) => {
  useEffect(() => {
    document.title = `${title} · Coldfill`
  }, [title])
  return (
    <div className="flex min-h-dvh items-center justify-center bg-paper p-3 desk:p-6">
      <main id="sheet" className="flex min-h-[560px] w-full max-w-[420px] flex-col border-2 border-ink bg-sheet">
        <div className="flex-1 px-6 pt-7 pb-8 desk:px-9">
          <h1 className="mb-6 text-title font-title">{title}</h1>
          {children}
        </div>
        <footer className="border-t-2 border-ink px-6 py-2.5 desk:px-9">
          <p className="font-mono text-cell font-semibold">Coldfill</p>
          <p className="text-cell text-pencil">Vessels for water systems: sized, reviewed, issued</p>
        </footer>
      </main>
    </div>
  )
}
