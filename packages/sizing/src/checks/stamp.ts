import { gaugeFromSpec } from '../calculate-sections.ts'
import type { ResultValue } from '../result.ts'
import type { VesselContext } from '../vessel-context.ts'

const PSI = 6894.757293168361
const GALLON = 3.785411784e-3
const BTU_PER_HOUR = 1055.05585262 / 3600
const fahrenheit = (t: number) => (t + 459.67) / 1.8

/**
 * Which limits of the pressure vessel code's exemptions are exceeded, in words; none where the vessel is exempt. Water vessels
 * with an air cushion: 300 psi and 210 °F; indirectly heated storage: 200,000 Btu/h, 210 °F and 120 gal (ASME BPVC VIII-1
 * U-1(c)(2)(f) and (g), IV HLW-101.2; clauses from memory).
 */
export const stampReasons = (
  context: VesselContext,
  results: Readonly<Record<string, ResultValue>>,
  atmosphere: number,
): readonly string[] => {
  const { system, vessel } = context
  const reasons: string[] = []
  const set = system.pressure['relief-valve']
  const pressure = set ? gaugeFromSpec(set, atmosphere).value : (results['maximum-pressure']?.value ?? 0)
  const hottest = Math.max(...Object.values(system.temperatures).map((t) => t?.value.value ?? 0), 0)
  const open = 'construction' in vessel.fields && vessel.fields.construction?.value === 'open'
  if (open) return []
  if (pressure > 300.001 * PSI) reasons.push('the pressure is above 300 psi')
  if (hottest > fahrenheit(210.01)) reasons.push('the temperature is above 210 °F')
  if (vessel.kind === 'storage tank') {
    const each = (results['required-volume'] ?? results['storage-volume'])?.value ?? 0
    const input = results['heat-input']?.value ?? 0
    if (each / (vessel.fields.quantity?.value ?? 1) > 120.001 * GALLON) reasons.push('the volume is above 120 gal')
    if (input > 200_001 * BTU_PER_HOUR) reasons.push('the heat input is above 200,000 Btu/h')
  }
  return reasons
}
