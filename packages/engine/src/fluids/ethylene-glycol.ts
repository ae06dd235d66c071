import { inhibitedEthyleneGlycol } from '../tables/ashrae-fundamentals-2005.ethylene-glycol.ts'
import {
  ethyleneGlycolDensity,
  ethyleneGlycolFreezing,
  ethyleneGlycolSpecificHeat,
} from '../tables/melinder-2010.ethylene-glycol.ts'
import type { Glycol } from './glycol.ts'

export const ethyleneGlycol: Glycol = {
  base: 'ethylene glycol',
  density: ethyleneGlycolDensity,
  specificHeat: ethyleneGlycolSpecificHeat,
  freezing: ethyleneGlycolFreezing,
  inhibited: inhibitedEthyleneGlycol,
}
