import type { UnitSystem } from '@coldfill/units'

/** Said beside a schedule or calculation, since the unit alone does not say it everywhere. */
export const gaugeRemark = (units: UnitSystem): string =>
  units === 'US'
    ? 'psig is gauge pressure, psia absolute, psi a difference.'
    : 'kPa is gauge pressure or a difference; kPa abs is absolute.'
