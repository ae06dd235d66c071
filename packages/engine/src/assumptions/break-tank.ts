import { defineAssumption } from '../assumption.ts'
import { citeFromMemory } from '../citation.ts'
import { commonPractice } from '../sources/common-practice.ts'

export const breakTankRefill = defineAssumption({
  id: 'break-tank.refill',
  name: 'flow from the main into a break tank during the peak',
  kind: 'flow',
  value: '0 gpm',
  source: citeFromMemory(commonPractice, 'storage for the failure of the main'),
  because: 'Not stated. Without a refill the tank comes out larger, never smaller.',
  overriddenBy: 'systems.*.vessels.*.refill-flow',
})

export const breakTankUsable = defineAssumption({
  id: 'break-tank.usable-fraction',
  name: 'usable part of a break tank',
  kind: 'ratio',
  value: '80 %',
  source: citeFromMemory(commonPractice, 'air gap and overflow above, suction below'),
  because: 'Not stated. The room above the overflow and the water below the suction cannot be used.',
  overriddenBy: 'systems.*.vessels.*.usable-fraction',
})
