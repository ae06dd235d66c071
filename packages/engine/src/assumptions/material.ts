import { defineAssumption } from '../assumption.ts'
import { cite } from '../citation.ts'
import { ashraeHvacSe } from '../sources/ashrae-hvac-se.ts'

export const systemMaterial = defineAssumption({
  id: 'material',
  name: 'material of most of the piping',
  kind: 'words',
  choices: ['steel', 'copper', 'none'],
  value: 'steel',
  source: cite(ashraeHvacSe, 'hydronic heating and cooling, nomenclature of the tank equations'),
  because:
    'Not stated. Steel expands less than copper, so less of the water finds room in the piping and the vessel comes out larger, never smaller.',
  overriddenBy: 'systems.*.vessels.*.material',
})

export const steelExpansion = defineAssumption({
  id: 'linear-expansion.steel',
  name: 'linear expansion of steel',
  kind: 'per temperature difference',
  value: '6.5e-6 1/°F',
  source: cite(ashraeHvacSe, 'hydronic heating and cooling, nomenclature of the tank equations'),
  because:
    'Handbook value, 11.7e-6 1/K. ASME B31.9 has 6.33e-6 1/°F; the difference moves a vessel by less than one per cent.',
  overriddenBy: 'assumptions',
})

export const copperExpansion = defineAssumption({
  id: 'linear-expansion.copper',
  name: 'linear expansion of copper',
  kind: 'per temperature difference',
  value: '9.5e-6 1/°F',
  source: cite(ashraeHvacSe, 'hydronic heating and cooling, nomenclature of the tank equations'),
  because: 'Handbook value, 17.1e-6 1/K, as ASME B31.9.',
  overriddenBy: 'assumptions',
})

export const domesticMaterial = defineAssumption({
  id: 'material.domestic',
  name: 'growth of heater and piping, domestic hot water',
  kind: 'words',
  choices: ['none'],
  value: 'none',
  source: cite(ashraeHvacSe, 'hydronic heating and cooling, tank equations without the term of the piping'),
  because:
    'Materials of the contents are not given, so no growth is credited; the vessel comes out larger, never smaller.',
  overriddenBy: 'systems.*.contents.*.material',
})
