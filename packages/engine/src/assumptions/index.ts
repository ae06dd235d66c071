import type { Assumption } from '../assumption.ts'
import { averageTemperature } from './average-temperature.ts'
import { emitterClasses } from './emitters.ts'
import { bufferCredit, bufferLoadMinimum, bufferVolumePerTon } from './buffer.ts'
import { copperExpansion, domesticMaterial, steelExpansion, systemMaterial } from './material.ts'
import {
  pressureTankPrecharge,
  reliefHeight,
  reliefMarginDomestic,
  reliefMarginHydronic,
  thermalExpansionCap,
  topMargin,
  topMarginEuropean,
  vesselConnection,
} from './pressure.ts'
import { construction, expansionTankMethod, thermalExpansionTankMethod } from './method.ts'
import {
  apartmentStorageFactor,
  demandLevel,
  dwellingDraw,
  dwellingPeople,
  fixtureDemandAge,
  fixtureDemandRange,
  peakTime,
  storageColdWater,
  storageTemperature,
  usableFraction,
} from './storage.ts'
import { elevation } from './site.ts'

const all: readonly Assumption[] = [
  elevation,
  expansionTankMethod,
  thermalExpansionTankMethod,
  construction,
  topMargin,
  topMarginEuropean,
  reliefMarginHydronic,
  reliefMarginDomestic,
  reliefHeight,
  vesselConnection,
  thermalExpansionCap,
  pressureTankPrecharge,
  systemMaterial,
  domesticMaterial,
  steelExpansion,
  copperExpansion,
  averageTemperature,
  bufferLoadMinimum,
  bufferCredit,
  bufferVolumePerTon,
  storageColdWater,
  storageTemperature,
  usableFraction,
  demandLevel,
  peakTime,
  fixtureDemandRange,
  fixtureDemandAge,
  apartmentStorageFactor,
  dwellingPeople,
  dwellingDraw,
  ...Object.values(emitterClasses),
]

/** Every documented default by id. */
export const assumptions: Readonly<Record<string, Assumption>> = Object.fromEntries(all.map((a) => [a.id, a]))
