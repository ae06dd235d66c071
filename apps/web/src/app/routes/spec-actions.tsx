import { Button } from '#components/ui/button.tsx'

interface Props {
  /** Why nothing may be edited; null where it may. */
  readonly locked: string | null
  readonly dirty: boolean
  readonly saving: boolean
  readonly comparing: boolean
  readonly outline: boolean
  readonly onOutline: () => void
  readonly onCompare: () => void
  readonly onFormat: () => void
  readonly onSave: () => void
}

/** Buttons over the editor. */
export const SpecActions = ({
  locked,
  dirty,
  saving,
  comparing,
  outline,
  onOutline,
  onCompare,
  onFormat,
  onSave,
}: Props) => (
  <>
    {comparing ? null : (
      <Button className="zones:hidden" aria-expanded={outline} aria-controls="outline" onClick={onOutline}>
        Outline
      </Button>
    )}
    <Button aria-pressed={comparing} onClick={onCompare}>
      Compare
    </Button>
    <Button
      className={comparing ? 'max-desk:hidden' : ''}
      why={locked ?? (comparing ? 'Close the comparison to format.' : null)}
      onClick={onFormat}
    >
      Format
    </Button>
    <Button look="main" busy={saving} why={locked ?? (dirty ? null : 'Everything is saved.')} onClick={onSave}>
      Save
    </Button>
  </>
)
