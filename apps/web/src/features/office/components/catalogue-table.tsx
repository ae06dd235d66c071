import type { CatalogueVessel } from '@coldfill/contract'
import { displayUnit, fromSi, unitLabel, type Kind, type UnitSystem } from '@coldfill/units'
import { Cell, HeadCell, RowHead, RuledTable } from '#components/ui/ruled-table.tsx'
import { capital } from '#lib/format.ts'

const numbers = [
  { key: 'volume', heading: 'Volume', kind: 'volume' },
  { key: 'acceptance', heading: 'Acceptance', kind: 'volume' },
  { key: 'maxPressure', heading: 'Max. pressure', kind: 'gauge pressure' },
  { key: 'maxTemperature', heading: 'Max. temp.', kind: 'temperature' },
] as const satisfies readonly { key: keyof CatalogueVessel; heading: string; kind: Kind }[]

type Column = (typeof numbers)[number] | typeof weight
const weight = { key: 'weightEmpty', heading: 'Weight', kind: 'mass' } as const

/** One decimal where a number of the column needs it, so that points align. */
const shownIn = (rows: readonly CatalogueVessel[], { key, kind }: Column, units: UnitSystem) => {
  const unit = displayUnit(kind, units)
  const read = (row: CatalogueVessel): number | null => (row[key] === null ? null : fromSi(row[key], unit))
  const isWhole = rows.every((row) => Math.abs((read(row) ?? 0) - Math.round(read(row) ?? 0)) < 0.05)
  return (row: CatalogueVessel): string | null => read(row)?.toFixed(isWhole ? 0 : 1) ?? null
}

const outside = ({ diameter, height }: CatalogueVessel, units: UnitSystem): string | null => {
  const said = (value: number | null) =>
    value === null ? '?' : String(Number(fromSi(value, displayUnit('diameter', units)).toFixed(units === 'US' ? 1 : 0)))
  return diameter === null && height === null ? null : `${said(diameter)} × ${said(height)}`
}

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
  const all: readonly Column[] = [...numbers, weight]
  const texts = new Map(all.map((column) => [column.key, shownIn(rows, column, units)]))
  const number = (row: CatalogueVessel, { key }: Column) => (
    <Cell key={key} figures className="font-mono">
      {texts.get(key)?.(row) ?? <span className="text-pencil">—</span>}
    </Cell>
  )
  const head = (key: string, heading: string, kind: Kind) => (
    <HeadCell key={key} figures>
      <span className={key === 'outside' ? 'whitespace-nowrap' : ''}>{heading}</span>
      <span className="block font-mono text-zone font-medium text-pencil">{unitLabel(kind, units)}</span>
    </HeadCell>
  )
  return (
    <>
      <RuledTable
        caption="Vessels of the catalogue"
        className="min-w-240"
        head={
          <tr>
            <HeadCell figures className="w-10">
              Line
            </HeadCell>
            <HeadCell>Maker and model</HeadCell>
            <HeadCell>Kind</HeadCell>
            {numbers.map(({ key, heading, kind }) => head(key, heading, kind))}
            <HeadCell>Potable</HeadCell>
            <HeadCell>Stamp</HeadCell>
            <HeadCell>Mounting</HeadCell>
            {head('outside', 'Dia. × height', 'diameter')}
            {head(weight.key, weight.heading, weight.kind)}
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
              <span className="desk:whitespace-nowrap">{row.maker}</span>{' '}
              <span className="block font-semibold">{row.model}</span>
            </RowHead>
            <Cell>
              {row.kinds.map((kind) => (
                <span key={kind} className="block">
                  {capital(kind)}
                </span>
              ))}
              {row.construction === null ? null : <span className="block text-pencil">{row.construction}</span>}
            </Cell>
            {numbers.map((column) => number(row, column))}
            <Cell>{row.potable ? 'Yes' : 'No'}</Cell>
            <Cell>{row.stamped ? 'Yes' : 'No'}</Cell>
            <Cell className="whitespace-nowrap">{capital(row.mounting ?? '—')}</Cell>
            <Cell figures className="font-mono whitespace-nowrap">
              {outside(row, units) ?? <span className="text-pencil">—</span>}
            </Cell>
            {number(row, weight)}
            <Cell className="whitespace-nowrap">{row.connection ?? '—'}</Cell>
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
