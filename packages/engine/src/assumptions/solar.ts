import { defineAssumption } from '../assumption.ts'
import { cite } from '../citation.ts'
import { commonPractice } from '../sources/common-practice.ts'
import { idae022 } from '../sources/idae-022.ts'

export const solarExpansionFraction = defineAssumption({
  id: 'solar.expansion-fraction',
  name: 'growth of the fluid of a solar loop',
  kind: 'ratio',
  value: '8.5 %',
  source: cite(idae022, 'p. 88, glycol mixture in a solar loop'),
  because: 'Not stated. Glycol mixture from cold to 130 or 140 °C; water grows less, so the vessel comes out larger.',
  overriddenBy: 'systems.*.vessels.*.expansion-fraction',
})

export const solarReserve = defineAssumption({
  id: 'solar.water-reserve',
  name: 'fluid kept in the vessel of a solar loop, cold',
  kind: 'volume',
  value: '3 L',
  source: cite(idae022, 'p. 88, reserve of 3 L at least'),
  because: 'Not stated. The least reserve of the guide; it makes up what is vented.',
  overriddenBy: 'systems.*.vessels.*.water-reserve',
})

export const drainBackReserve = defineAssumption({
  id: 'drain-back.reserve',
  name: 'water that stays in a drain-back tank while the loop is full',
  kind: 'volume',
  value: '4 gal',
  source: cite(commonPractice, 'water over the pump suction of a drain-back tank'),
  because:
    'Not stated. Some gallons keep the pump suction under water; the maker of the pump or tank may ask for more.',
  overriddenBy: 'systems.*.vessels.*.water-reserve',
})
