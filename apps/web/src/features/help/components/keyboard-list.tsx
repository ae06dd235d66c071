const keys: readonly (readonly [string, string])[] = [
  ['Ctrl+S', 'save'],
  ['F8, Shift+F8', 'next, previous finding'],
  ['Ctrl+Space', 'what can be typed here'],
  ['Ctrl+.', 'what mends the finding here, and other units, each with the lines it would change'],
  ['F12, or a click with Ctrl', 'to where the mark, system or fluid is given'],
  ['Shift+F12', 'where it is used'],
  ['F2', 'another name for it, everywhere at once'],
  ['Shift+Alt+F', 'tidy indentation and spacing'],
  ['Ctrl+Shift+[, Ctrl+Shift+]', 'fold, unfold the block'],
  ['Ctrl+Alt+[, Ctrl+Alt+]', 'fold, unfold everything'],
  ['Ctrl+F', 'search and replace'],
  ['Alt+N, Alt+P', 'next, previous place that differs, where two texts are compared'],
  ['Esc, then Tab', 'leave the editor'],
]

/** Keys of the spec editor. On a Mac, Cmd stands for Ctrl. */
export const KeyboardList = () => (
  <dl className="border-t-2 border-ink">
    {keys.map(([key, what]) => (
      <div key={key} className="grid gap-x-4 border-b border-hair py-1.5 desk:grid-cols-[16rem_minmax(0,1fr)]">
        <dt className="font-mono text-cell">{key}</dt>
        <dd className="text-read">{what}</dd>
      </div>
    ))}
  </dl>
)
