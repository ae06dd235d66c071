import type { UnitSystem } from '@coldfill/units'

/** Said beside a schedule or calculation, since the unit alone does not say it everywhere. */
export const gaugeRemark = (units: UnitSystem): string =>
  units === 'US'
    ? 'Gauge pressure is in psig, absolute pressure in psia, a difference of pressures in psi.'
    : 'Gauge pressure and differences of pressure are in kPa, absolute pressure is in kPa abs.'
