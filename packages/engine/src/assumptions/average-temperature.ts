import { defineAssumption } from '../assumption.ts'
import { citeFromMemory } from '../citation.ts'
import { imc } from '../sources/imc.ts'

export const averageTemperature = defineAssumption({
  id: 'average-temperature',
  name: 'average operating temperature for the code equation',
  kind: 'words',
  choices: ['highest water temperature'],
  value: 'highest water temperature',
  source: citeFromMemory(imc, '1009.2, definition of T'),
  because:
    'Not stated. The highest temperature stands in for the average; the minimum comes out larger, never smaller.',
  overriddenBy: 'systems.*.temperatures.average',
})
