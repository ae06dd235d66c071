import type { CatalogueVessel } from '@coldfill/contract'
import { formatValue, unitLabel, type Kind, type UnitSystem } from '@coldfill/units'
import { Cell, HeadCell, RowHead, RuledTable } from '#components/ui/ruled-table.tsx'
import { capital } from '#lib/format.ts'

const numbers = [
  { key: 'volume', heading: 'Volume', kind: 'volume' },
  { key: 'acceptance', heading: 'Acceptance', kind: 'volume' },
  { key: 'maxPressure', heading: 'Max. pressure', kind: 'gauge pressure' },
  { key: 'maxTemperature', heading: 'Max. temp.', kind: 'temperature' },
] as const satisfies readonly { key: keyof CatalogueVessel; heading: string; kind: Kind }[]

const sizes = [
  { key: 'diameter', heading: 'Diameter', kind: 'diameter' },
  { key: 'height', heading: 'Height', kind: 'diameter' },
  { key: 'weightEmpty', heading: 'Weight', kind: 'mass' },
] as const satisfies readonly { key: keyof CatalogueVessel; heading: string; kind: Kind }[]

/** Most rows that are drawn; more are in the file. */
const MOST = 500

/** Rows of a catalogue in the units shown. */
export const CatalogueTable = ({
  rows,
  units,
}: {
  readonly rows: readonly CatalogueVessel[]
  readonly units: UnitSystem
}) => {
  const number = (row: CatalogueVessel, { key, kind }: (typeof numbers)[number] | (typeof sizes)[number]) => {
    const value = row[key]
    return (
      <Cell key={key} figures className="font-mono">
        {value === null ? <span className="text-pencil">—</span> : formatValue({ kind, value }, units)}
      </Cell>
    )
  }
  const heads = (columns: typeof numbers | typeof sizes) =>
    columns.map(({ key, heading, kind }) => (
      <HeadCell key={key} figures>
        {heading}
        <span className="block font-mono text-zone font-medium text-pencil">{unitLabel(kind, units)}</span>
      </HeadCell>
    ))
  return (
    <>
      <RuledTable
        caption="Vessels of the catalogue"
        className="min-w-280"
        head={
          <tr>
            <HeadCell figures className="w-10">
              Line
            </HeadCell>
            <HeadCell>Maker and model</HeadCell>
            <HeadCell>Kind</HeadCell>
            <HeadCell>Type</HeadCell>
            {heads(numbers)}
            <HeadCell>Potable</HeadCell>
            <HeadCell>Stamp</HeadCell>
            <HeadCell>Mounting</HeadCell>
            {heads(sizes)}
            <HeadCell>Connection</HeadCell>
          </tr>
        }
      >
        {rows.slice(0, MOST).map((row) => (
          <tr key={row.line}>
            <Cell figures className="text-pencil">
              {row.line}
            </Cell>
            <RowHead className="font-normal">
              {row.maker} <span className="font-semibold whitespace-nowrap">{row.model}</span>
            </RowHead>
            <Cell>{capital(row.kinds.join(', '))}</Cell>
            <Cell>{capital(row.construction ?? '—')}</Cell>
            {numbers.map((column) => number(row, column))}
            <Cell>{row.potable ? 'Yes' : 'No'}</Cell>
            <Cell>{row.stamped ? 'Yes' : 'No'}</Cell>
            <Cell className="whitespace-nowrap">{capital(row.mounting ?? '—')}</Cell>
            {sizes.map((column) => number(row, column))}
            <Cell>{row.connection ?? '—'}</Cell>
          </tr>
        ))}
      </RuledTable>
      {rows.length > MOST ? (
        <p className="text-cell text-pencil">
          The first {MOST} of {rows.length}. All of them are used.
        </p>
      ) : null}
    </>
  )
}
