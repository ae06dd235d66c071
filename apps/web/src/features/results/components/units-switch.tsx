import type { UnitSystem } from '@coldfill/units'
import { Choice } from '#components/ui/choice.tsx'

/** Units shown. Values keep the unit they were written in; only the display changes. */
export const UnitsSwitch = ({
  units,
  onChoose,
}: {
  readonly units: UnitSystem
  readonly onChoose: (units: UnitSystem) => void
}) => (
  <Choice
    label="Units"
    value={units}
    choices={[
      { value: 'US', label: 'US' },
      { value: 'SI', label: 'SI' },
    ]}
    onChoose={onChoose}
  />
)
