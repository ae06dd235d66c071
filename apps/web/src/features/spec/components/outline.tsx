import type { Range, SpecModel } from '@coldfill/spec'
import type { MarginEntry } from '../margin-lines.ts'

interface Props {
  readonly model: SpecModel | null
  readonly entries: readonly MarginEntry[]
  readonly stale: boolean
  readonly onJump: (range: Range) => void
}

/** Systems and vessels of the text, each with its size; a way through a long spec. */
export const Outline = ({ model, entries, stale, onJump }: Props) => (
  <nav aria-label="Outline" className="h-full overflow-y-auto border-r border-hair py-2">
    {model?.systems.map((system) => (
      <div key={system.path} className="pb-2">
        <button
          type="button"
          onClick={() => onJump(system.range)}
          className="block w-full px-3 py-0.5 text-left hover:bg-steel-wash"
        >
          <span className="font-mono text-cell font-semibold">{system.id}</span>
          {system.title ? <span className="block truncate text-cell text-pencil">{system.title.value}</span> : null}
        </button>
        <ul>
          {system.vessels.map((vessel) => {
            const entry = entries.find((one) => one.mark === vessel.mark)
            return (
              <li key={vessel.path}>
                <button
                  type="button"
                  onClick={() => onJump(vessel.range)}
                  className="flex w-full items-baseline justify-between gap-2 py-[3px] pr-3 pl-6 text-left hover:bg-steel-wash"
                >
                  <span className="font-mono text-cell whitespace-nowrap">
                    {vessel.mark}
                    {entry?.was ? (
                      <span className="ml-1 font-sans text-redline" title={`${entry.was} in the last issue`}>
                        △
                      </span>
                    ) : null}
                  </span>
                  <span
                    className={`figures truncate text-cell ${entry?.sized === false ? 'text-fault' : 'text-pencil'} ${stale ? 'opacity-60' : ''}`}
                  >
                    {entry?.size}
                  </span>
                </button>
              </li>
            )
          })}
        </ul>
      </div>
    )) ?? <p className="px-3 text-cell text-pencil">No outline while the text cannot be read.</p>}
  </nav>
)
