import type { Assumption } from '../assumption.ts'
import { averageTemperature } from './average-temperature.ts'
import { emitterClasses } from './emitters.ts'
import { bufferCredit, bufferLoadMinimum, bufferVolumePerTon } from './buffer.ts'
import { glycolExpansionUncertainty } from './glycol.ts'
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
import { breakTankRefill, breakTankUsable } from './break-tank.ts'
import { glycolDrum, glycolMakeUp } from './glycol-feeder.ts'
import { bodyVelocity, enteringVelocity } from './separators.ts'
import { drainBackReserve, solarExpansionFraction, solarReserve } from './solar.ts'
import {
  blowdownCoolingWater,
  blowdownDrainTemperature,
  blowdownLevelDrop,
  boilerFeedHolding,
  boilerFeedPumpFactor,
  boilerFeedUsable,
  condensateDuty,
  condensateHolding,
  condensatePumpFactor,
  condensateTemperature,
  condensateUsable,
  flashVelocity,
} from './steam.ts'
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
  glycolExpansionUncertainty,
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
  solarExpansionFraction,
  solarReserve,
  drainBackReserve,
  glycolMakeUp,
  glycolDrum,
  enteringVelocity,
  bodyVelocity,
  flashVelocity,
  blowdownLevelDrop,
  blowdownDrainTemperature,
  blowdownCoolingWater,
  condensateTemperature,
  condensateDuty,
  condensatePumpFactor,
  condensateHolding,
  condensateUsable,
  boilerFeedHolding,
  boilerFeedUsable,
  boilerFeedPumpFactor,
  breakTankRefill,
  breakTankUsable,
  ...Object.values(emitterClasses),
]

/** Every documented default by id. */
export const assumptions: Readonly<Record<string, Assumption>> = Object.fromEntries(all.map((a) => [a.id, a]))
