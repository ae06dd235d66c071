import { defineAssumption } from '../assumption.ts'
import { cite, citeFromMemory } from '../citation.ts'
import { ashraeHvacSe } from '../sources/ashrae-hvac-se.ts'
import { commonPractice } from '../sources/common-practice.ts'
import { en12828 } from '../sources/en-12828.ts'
import { upc } from '../sources/upc.ts'

export const topMargin = defineAssumption({
  id: 'top-margin',
  name: 'pressure kept at the highest point, cold',
  kind: 'gauge pressure',
  value: '4 psi',
  source: citeFromMemory(ashraeHvacSe, 'hydronic heating and cooling, fill pressure'),
  because: 'Not stated. Four to five psi at the top keeps air out and lets it be vented; the lower figure is usual.',
  overriddenBy: 'systems.*.pressure.top-margin',
})

export const topMarginEuropean = defineAssumption({
  id: 'top-margin.european',
  name: 'pressure kept at the highest point, cold, under a European method',
  kind: 'gauge pressure',
  value: '0.3 bar',
  source: citeFromMemory(en12828, 'Annex D, vapour pressure and margin'),
  because: 'Not stated. EN, DIN and BS methods add 0.3 bar to the static pressure.',
  overriddenBy: 'systems.*.pressure.top-margin',
})

export const reliefMarginHydronic = defineAssumption({
  id: 'relief-margin.hydronic',
  name: 'margin below the relief valve, hydronic',
  kind: 'ratio',
  alsoKind: 'pressure difference',
  value: '10 %',
  source: cite(commonPractice, 'highest pressure at 0.9 of the set pressure'),
  because: 'Not stated. A valve that works close to its set pressure weeps; ASHRAE leaves the figure to the designer.',
  overriddenBy: 'systems.*.pressure.relief-margin',
})

export const reliefMarginDomestic = defineAssumption({
  id: 'relief-margin.domestic',
  name: 'margin below the relief valve, domestic water',
  kind: 'ratio',
  alsoKind: 'pressure difference',
  value: '10 %',
  source: cite(commonPractice, 'highest pressure at 0.9 of the set pressure'),
  because: 'Not stated. A valve that works close to its set pressure weeps and scales.',
  overriddenBy: 'systems.*.pressure.relief-margin',
})

export const reliefHeight = defineAssumption({
  id: 'relief-height',
  name: 'height of the relief valve above the vessel',
  kind: 'length',
  value: '0 ft',
  source: cite(commonPractice, 'valve and vessel in one plant room'),
  because:
    'Not stated. A valve above the vessel would allow a higher pressure at the vessel, one below it a lower pressure; give it where they stand at different heights.',
  overriddenBy: 'systems.*.pressure.relief-height',
})

export const vesselConnection = defineAssumption({
  id: 'vessel-connection',
  name: 'where the vessel is connected',
  kind: 'words',
  choices: ['pump suction', 'pump discharge'],
  value: 'pump suction',
  source: cite(ashraeHvacSe, 'hydronic heating and cooling, point of no pressure change'),
  because:
    'Not stated. Pumping away from the vessel is usual; at the discharge the fill pressure would have to cover the pump head too.',
  overriddenBy: 'systems.*.pressure.vessel-connection',
})

export const thermalExpansionCap = defineAssumption({
  id: 'thermal-expansion-cap',
  name: 'highest pressure that thermal expansion may cause at fixtures',
  kind: 'gauge pressure',
  value: '80 psi',
  source: cite(upc, '608.2 (IPC 607.3 and 604.8 say the same)'),
  because:
    'The adopted plumbing code limits the pressure at fixtures to 80 psi, thermal expansion included; sizing to the relief valve would not meet it.',
  overriddenBy: 'systems.*.pressure.maximum',
})

export const pressureTankPrecharge = defineAssumption({
  id: 'pressure-tank.precharge-below-cut-in',
  name: 'precharge of a pressure tank below the cut-in pressure',
  kind: 'pressure difference',
  value: '2 psi',
  source: cite(commonPractice, 'precharge 2 psi below cut-in'),
  because: 'Not stated. A charge just below cut-in leaves a little water in the tank when the pump starts.',
  overriddenBy: 'systems.*.vessels.*.precharge',
})
