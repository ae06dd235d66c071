import { findingPages } from '@coldfill/spec'
import { Scrollable } from '#components/ui/scrollable.tsx'

const pages = new Map<string, ReturnType<typeof findingPages>[number]>(findingPages().map((page) => [page.code, page]))

/** A mistake that raises the code, with what is underlined, beside what stands there once it is mended. */
export const CodeExample = ({ code }: { readonly code: string }) => {
  const example = pages.get(code)?.example
  if (!example) return null
  const { wrong, right, underlined } = example
  const box = 'min-w-0 bg-well px-2 py-1 font-mono text-[12.5px] leading-[18px]'
  return (
    <div className="mt-1 grid gap-2 bench:grid-cols-2">
      <Scrollable label="Wrong" className={box}>
        <pre className="w-max">
          <span className="sr-only">Wrong: </span>
          {wrong.slice(0, underlined.start)}
          <span className="underline decoration-fault decoration-wavy underline-offset-[3px]">
            {wrong.slice(underlined.start, underlined.end)}
          </span>
          {wrong.slice(underlined.end)}
        </pre>
      </Scrollable>
      <Scrollable label="Mended" className={box}>
        <pre className="w-max">
          <span className="sr-only">Mended: </span>
          {right}
        </pre>
      </Scrollable>
    </div>
  )
}
