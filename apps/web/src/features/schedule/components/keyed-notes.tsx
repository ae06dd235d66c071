import type { Schedule } from '../schedule-table.ts'

/** Notes of a schedule by number, and what the signs in its cells mean. */
export const KeyedNotes = ({
  schedule,
  hidden,
}: {
  readonly schedule: Schedule
  readonly hidden: ReadonlySet<string>
}) => {
  const left = schedule.columns.filter((column) => hidden.has(column.key)).map((column) => column.heading)
  const texts = schedule.rows.flatMap((row) => Object.values(row.cells).map((cell) => cell.text))
  const signs = [
    texts.includes('—') ? '— does not apply' : '',
    texts.includes('?') ? '? an input is missing' : '',
  ].filter(Boolean)
  return (
    <div className="mt-2 flex flex-col gap-1 text-cell">
      {schedule.notes.length > 0 ? (
        <ol>
          {schedule.notes.map((note, at) => (
            <li key={note} className="flex gap-2">
              <span className="figures w-4 shrink-0 text-right font-mono">{at + 1}</span>
              <span className="max-w-[90ch]">{note}</span>
            </li>
          ))}
        </ol>
      ) : null}
      <p className="text-pencil">
        {signs.join(' · ')}
        {signs.length > 0 && left.length > 0 ? ' · ' : ''}
        {left.length > 0 ? `Hidden columns: ${left.join(', ')}` : ''}
      </p>
    </div>
  )
}
