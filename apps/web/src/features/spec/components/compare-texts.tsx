import { useMemo } from 'react'
import { diffLines, nearChanges } from '#lib/line-diff.ts'
import { Button } from '#components/ui/button.tsx'

interface Props {
  readonly left: { readonly title: string; readonly text: string }
  readonly right: { readonly title: string; readonly text: string }
  readonly onClose: () => void
}

const Side = ({
  side,
  changed,
  sign,
}: {
  readonly side: { readonly line: number; readonly text: string } | null
  readonly changed: boolean
  readonly sign: string
}) => (
  <>
    <td className="w-10 border-b border-hair px-1 text-right align-top text-pencil select-none">{side?.line ?? ''}</td>
    <td
      className={`w-1/2 border-b border-hair px-2 align-top break-words whitespace-pre-wrap ${changed && side ? 'bg-steel-wash' : side ? '' : 'bg-well'}`}
    >
      {changed && side ? <span className="mr-1 font-semibold text-steel">{sign}</span> : null}
      {side?.text ?? ''}
    </td>
  </>
)

/** Two texts side by side, changed lines with a few around them. */
export const CompareTexts = ({ left, right, onClose }: Props) => {
  const rows = useMemo(() => nearChanges(diffLines(left.text, right.text)), [left.text, right.text])
  const same = rows.every((row) => row === null || row.kind === 'same')
  return (
    <section aria-label="Compare" className="flex min-h-0 flex-1 flex-col border-t-2 border-ink bg-sheet">
      <div className="flex shrink-0 items-center justify-between gap-4 px-3 py-1.5">
        <p className="font-semibold">
          {left.title} <span className="font-normal text-pencil">beside</span> {right.title}
        </p>
        <Button small onClick={onClose}>
          Close the comparison
        </Button>
      </div>
      <div
        className="min-h-0 flex-1 overflow-auto border-t border-hair"
        tabIndex={0}
        role="region"
        aria-label="Compared texts"
      >
        {same ? (
          <p className="px-3 py-2">The texts are the same.</p>
        ) : (
          <table className="w-full table-fixed font-mono text-[12.5px] leading-[18px]">
            <caption className="sr-only">
              {left.title} at the left, {right.title} at the right
            </caption>
            <colgroup>
              <col className="w-10" />
              <col />
              <col className="w-10" />
              <col />
            </colgroup>
            <thead>
              <tr>
                <th colSpan={2} scope="col" className="sticky top-0 border-b-2 border-ink bg-sheet px-2 font-sans">
                  {left.title}
                </th>
                <th colSpan={2} scope="col" className="sticky top-0 border-b-2 border-ink bg-sheet px-2 font-sans">
                  {right.title}
                </th>
              </tr>
            </thead>
            <tbody>
              {rows.map((row, at) =>
                row === null ? (
                  <tr key={`gap ${at}`}>
                    <td colSpan={4} className="border-b border-hair bg-well px-2 text-center text-pencil">
                      ⋯
                    </td>
                  </tr>
                ) : (
                  <tr key={`${row.left?.line ?? '-'} ${row.right?.line ?? '-'}`}>
                    <Side side={row.left} changed={row.kind !== 'same'} sign="−" />
                    <Side side={row.right} changed={row.kind !== 'same'} sign="+" />
                  </tr>
                ),
              )}
            </tbody>
          </table>
        )}
      </div>
    </section>
  )
}
