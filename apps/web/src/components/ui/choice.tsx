interface Props<T extends string> {
  readonly label: string
  readonly value: T
  readonly choices: readonly { readonly value: T; readonly label: string }[]
  readonly onChoose: (value: T) => void
}

/** Two to four alternatives side by side, of which one holds. */
export const Choice = <T extends string>({ label, value, choices, onChoose }: Props<T>) => (
  <div role="radiogroup" aria-label={label} className="inline-flex border-[1.5px] border-rule print:hidden">
    {choices.map((choice) => (
      <button
        key={choice.value}
        type="button"
        role="radio"
        aria-checked={choice.value === value}
        tabIndex={choice.value === value ? 0 : -1}
        onClick={() => onChoose(choice.value)}
        onKeyDown={(event) => {
          const step =
            event.key === 'ArrowRight' || event.key === 'ArrowDown'
              ? 1
              : event.key === 'ArrowLeft' || event.key === 'ArrowUp'
                ? -1
                : 0
          if (step === 0) return
          event.preventDefault()
          const at = choices.findIndex((other) => other.value === value)
          const next = (at + step + choices.length) % choices.length
          const chosen = choices[next]
          if (!chosen) return
          onChoose(chosen.value)
          const sibling = event.currentTarget.parentElement?.children[next]
          if (sibling instanceof HTMLElement) sibling.focus()
        }}
        className={`h-[29px] px-2.5 text-cell font-medium ${choice.value === value ? 'bg-ink text-sheet' : 'bg-sheet text-ink hover:bg-steel-wash'}`}
      >
        {choice.label}
      </button>
    ))}
  </div>
)
