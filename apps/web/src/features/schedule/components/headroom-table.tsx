import type { UnitSystem } from '@coldfill/units'
import { Formula } from '#components/ui/math.tsx'
import { Cell, HeadCell, RowHead, RuledTable } from '#components/ui/ruled-table.tsx'
import { capital } from '#lib/format.ts'
import type { Vessel } from '#lib/sized-project.ts'
import { drawnSymbol } from '../drawn-step.ts'
import { shownHeadroom } from '../headroom.ts'

/** Which inputs drive the size, and how far each may move by itself before the chosen vessel is too small. */
export const HeadroomTable = ({ vessel, units }: { readonly vessel: Vessel; readonly units: UnitSystem }) => {
  const rows = shownHeadroom(vessel.headroom, units)
  const chosen = vessel.selected !== null
  return (
    <>
      <ul className="border-t-[3px] border-ink text-cell desk:hidden">
        {rows.map((row) => (
          <li key={row.entry} className="border-b border-hair py-1.5">
            <p>
              <Formula markup={drawnSymbol(row.symbol)} /> <a href={`#${row.entry}`}>{capital(row.name)}</a>
            </p>
            <p className="figures flex flex-wrap justify-between gap-x-4 font-mono">
              <span>
                {row.now}
                {chosen ? <span className="font-sans text-pencil"> may go to </span> : null}
                {chosen ? (row.limit ?? <span className="font-sans text-pencil">any value</span>) : null}
              </span>
              <span>{row.change}</span>
            </p>
          </li>
        ))}
      </ul>
      <div className="max-desk:hidden">
        <RuledTable
          caption={chosen ? 'Headroom with the chosen vessel' : 'What moves the required volume'}
          className="min-w-140"
          head={
            <tr>
              <HeadCell>Input</HeadCell>
              <HeadCell figures>Now</HeadCell>
              <HeadCell figures>Changes the required volume by</HeadCell>
              {chosen ? <HeadCell figures>May go to</HeadCell> : null}
            </tr>
          }
        >
          {rows.map((row) => (
            <tr key={row.entry}>
              <RowHead className="font-normal">
                <Formula markup={drawnSymbol(row.symbol)} /> <a href={`#${row.entry}`}>{capital(row.name)}</a>
              </RowHead>
              <Cell figures className="font-mono whitespace-nowrap">
                {row.now}
              </Cell>
              <Cell figures className="font-mono whitespace-nowrap">
                {row.change}
              </Cell>
              {chosen ? (
                <Cell figures className="font-mono whitespace-nowrap">
                  {row.limit ?? <span className="font-sans text-pencil">any value</span>}
                </Cell>
              ) : null}
            </tr>
          ))}
        </RuledTable>
      </div>
      <p className="mt-2 max-w-[80ch] text-cell text-pencil">
        Each input moves alone, the others stay as they are.
        {chosen && rows.some((row) => row.limit === null)
          ? ' Any value: no value of this input alone makes the chosen vessel too small.'
          : ''}
      </p>
    </>
  )
}
