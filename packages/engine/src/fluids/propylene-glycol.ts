import { inhibitedPropyleneGlycol } from '../tables/ashrae-fundamentals-2005.propylene-glycol.ts'
import {
  propyleneGlycolDensity,
  propyleneGlycolFreezing,
  propyleneGlycolSpecificHeat,
} from '../tables/melinder-2010.propylene-glycol.ts'
import type { Glycol } from './glycol.ts'

export const propyleneGlycol: Glycol = {
  base: 'propylene glycol',
  density: propyleneGlycolDensity,
  specificHeat: propyleneGlycolSpecificHeat,
  freezing: propyleneGlycolFreezing,
  inhibited: inhibitedPropyleneGlycol,
}
