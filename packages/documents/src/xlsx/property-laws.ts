import { if97Least, if97Region1Most, saturationPressure, type Fluid } from '@coldfill/engine'
import type { VesselResult } from '@coldfill/sizing'
import type { FluidCells } from './fluid-data-sheet.ts'
import { glycolRows } from './glycol-rows.ts'
import type { PropertyLaw } from './property-row.ts'
import { saturationRows, steamRows } from './steam-rows.ts'
import { waterRows } from './water-rows.ts'

/** Room for the rounding of 32 °F to kelvin, as the engine leaves it. */
const SLACK = 1e-6

const OF_FLUID: Readonly<Record<string, string>> = { v_sat: 'v', rho: 'ρ', c_p: 'c_p' }
const OF_STEAM: Readonly<Record<string, string>> = { h_f: 'h_f', h_fg: 'h_fg', v_g: 'v_g' }

/** The fluid functions of a vessel as rows of cells, by name. A function without cells is not among them. */
export const propertyLaws = (fluid: Fluid, cells: FluidCells): ReadonlyMap<string, PropertyLaw> => {
  const laws = new Map<string, PropertyLaw>()
  const temperature = { symbol: 'T', name: 'temperature', unit: 'K', scale: 1 }
  const isWater = fluid.massFraction === 0
  const rows = isWater ? waterRows(cells.water) : glycolRows(fluid, cells)
  const { least, most } = fluid.validity
  for (const [name, property] of Object.entries(OF_FLUID))
    laws.set(name, { property, argument: { ...temperature, least: least - SLACK, most: most + SLACK }, rows })
  if (!cells.steam) return laws
  const range = { least: if97Least - SLACK, most: if97Region1Most + SLACK }
  const ofSteam = steamRows(cells.water, cells.steam)
  for (const [name, property] of Object.entries(OF_STEAM))
    laws.set(name, { property, argument: { ...temperature, ...range }, rows: ofSteam })
  laws.set('t_sat', {
    property: 'T_sat',
    argument: {
      symbol: 'P',
      name: 'absolute pressure',
      unit: 'MPa abs',
      scale: 1e6,
      least: saturationPressure(if97Least),
      most: saturationPressure(if97Region1Most),
    },
    rows: saturationRows(cells.water),
  })
  return laws
}

const STEAM = new RegExp(`\\b(?:t_sat|${Object.keys(OF_STEAM).join('|')})\\(`)

/** True where a step of the vessel needs the coefficients of steam. */
export const asksForSteam = ({ trace }: Pick<VesselResult, 'trace'>): boolean =>
  trace.some(({ entries }) => entries.some((entry) => entry.entry === 'step' && STEAM.test(entry.formula)))
