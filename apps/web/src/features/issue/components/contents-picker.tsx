import type { ContentsChoice } from '@coldfill/contract'
import { Choice } from '#components/ui/choice.tsx'
import { CheckField } from '#components/ui/field.tsx'

/** What the documents of an issue are made with; what is not touched is left to the server. */
export const ContentsPicker = ({
  contents,
  onChange,
  hint,
  of,
}: {
  readonly contents: ContentsChoice
  readonly onChange: (contents: ContentsChoice) => void
  readonly hint: string
  /** Which files: tells two pickers on one sheet apart. */
  readonly of: 'files for review' | 'files for construction'
}) => (
  <fieldset className="flex flex-col gap-2">
    <legend className="mb-1 text-cell font-semibold">Contents of the {of}</legend>
    <div className="flex flex-wrap items-center gap-x-3 gap-y-1">
      <span className="text-cell">Units</span>
      <Choice
        label={`Units of the ${of}`}
        value={contents.units ?? 'spec'}
        choices={[
          { value: 'spec', label: 'As in the spec' },
          { value: 'US', label: 'US' },
          { value: 'SI', label: 'SI' },
        ]}
        onChoose={(units) => onChange({ ...contents, units: units === 'spec' ? undefined : units })}
      />
    </div>
    <CheckField
      label="Redlines with their answers, as an appendix of the submittal"
      checked={contents.redlines ?? false}
      onChange={(event) => onChange({ ...contents, redlines: event.target.checked })}
    />
    <CheckField
      label="Verification, every published case with its deviation, as an appendix of the submittal"
      checked={contents.verification ?? false}
      onChange={(event) => onChange({ ...contents, verification: event.target.checked })}
    />
    <p className="text-cell text-pencil">{hint}</p>
  </fieldset>
)
