type Severity = 'error' | 'warning' | 'note'

export const severityWord: Record<Severity, string> = { error: 'Error', warning: 'Warning', note: 'Note' }

/** A solid square E, a diamond W or a ring i: told apart by shape and letter, never by colour alone. */
export const SeverityMark = ({ severity, label = true }: { readonly severity: Severity; readonly label?: boolean }) => (
  <svg
    width="16"
    height="16"
    viewBox="0 0 16 16"
    className="keeps-colour inline-block shrink-0"
    {...(label ? { role: 'img', 'aria-label': severityWord[severity] } : { 'aria-hidden': true })}
  >
    {severity === 'error' ? <rect x="1" y="1" width="14" height="14" className="fill-fault" /> : null}
    {severity === 'warning' ? <path d="M8 0 16 8 8 16 0 8Z" className="fill-ochre" /> : null}
    {severity === 'note' ? <circle cx="8" cy="8" r="6.5" className="fill-none stroke-steel" strokeWidth="1.5" /> : null}
    <text
      x="8"
      y={severity === 'warning' ? 11 : 11.5}
      textAnchor="middle"
      className={`font-bold ${severity === 'note' ? 'font-mono' : 'font-sans'} ${severity === 'note' ? 'fill-steel' : 'fill-sheet'}`}
      fontSize={severity === 'warning' ? 8 : 10}
    >
      {severity === 'error' ? 'E' : severity === 'warning' ? 'W' : 'i'}
    </text>
  </svg>
)
