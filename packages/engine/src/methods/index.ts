import type { Method } from '../method.ts'
import { site } from '../sections/site.ts'
import { bufferDefrost } from './buffer-tank/defrost.ts'
import { bufferEn3035 } from './buffer-tank/en-303-5.ts'
import { bufferRunTime } from './buffer-tank/run-time.ts'
import { bufferVolumePerTon } from './buffer-tank/volume-per-ton.ts'
import { ashraeDiaphragm, ashraeDiaphragmOtherCharge } from './expansion-tank/ashrae-diaphragm.ts'
import { ashraeOpen } from './expansion-tank/ashrae-open.ts'
import { ashraePlainSteel } from './expansion-tank/ashrae-plain-steel.ts'
import { bs7074Bladder, bs7074Diaphragm, checkBackBs7074 } from './expansion-tank/bs-7074.ts'
import { checkBackDiaphragm, checkBackOtherCharge, checkBackPlainSteel } from './expansion-tank/check-back.ts'
import { codeMinimumChecks } from './expansion-tank/code-minimum-check.ts'
import { codeMinimumDiaphragm, codeMinimumPlainSteel } from './expansion-tank/code-minimum.ts'
import { din4807 } from './expansion-tank/din-4807.ts'
import { checkBackEuropean, en12828Glycol, en12828Water } from './expansion-tank/en-12828.ts'
import { checkBackUne, une100155Glycol, une100155Water } from './expansion-tank/une-100155.ts'
import { glycolUncertainty } from './glycol-uncertainty.ts'
import { equalShares } from './equal-shares.ts'
import { fullWeight } from './full-weight.ts'
import { pressureTankMethods } from './pressure-tank/pressure-tank.ts'
import { storageTankMethods } from './storage-tank/index.ts'
import { breakTank } from './break-tank/break-tank.ts'
import { drainBack } from './drain-back-tank/drain-back.ts'
import { glycolFeeder, glycolFeederWithPump } from './glycol-feeder/glycol-feeder.ts'
import { airAndDirtSeparator } from './separators/air-and-dirt-separator.ts'
import { hydraulicSeparator } from './separators/hydraulic-separator.ts'
import { solar, solarOtherCharge } from './solar-expansion-tank/idae.ts'
import { blowdownByLevel, blowdownByVolume } from './steam-vessels/blowdown-separator.ts'
import {
  boilerFeedReceiver,
  condensateReceiver,
  condensateReceiverStated,
} from './steam-vessels/condensate-receiver.ts'
import { flashTank } from './steam-vessels/flash-tank.ts'
import { din4807Part5Vessel } from './thermal-expansion-tank/din-4807-5.ts'
import { gasLawMethods } from './thermal-expansion-tank/gas-law.ts'

/** Every method, the more particular before the more general of one name: the first that fits is used. */
const all: readonly Method[] = [
  site,
  ashraeDiaphragmOtherCharge,
  ashraeDiaphragm,
  ashraePlainSteel,
  ashraeOpen,
  en12828Glycol,
  en12828Water,
  din4807,
  une100155Glycol,
  une100155Water,
  bs7074Diaphragm,
  bs7074Bladder,
  codeMinimumDiaphragm,
  codeMinimumPlainSteel,
  ...gasLawMethods,
  din4807Part5Vessel,
  bufferRunTime,
  bufferVolumePerTon,
  bufferEn3035,
  bufferDefrost,
  ...pressureTankMethods,
  ...storageTankMethods,
  solarOtherCharge,
  solar,
  glycolFeederWithPump,
  glycolFeeder,
  airAndDirtSeparator,
  hydraulicSeparator,
  drainBack,
  flashTank,
  blowdownByVolume,
  blowdownByLevel,
  boilerFeedReceiver,
  condensateReceiverStated,
  condensateReceiver,
  breakTank,
  checkBackDiaphragm,
  checkBackOtherCharge,
  checkBackPlainSteel,
  checkBackEuropean,
  checkBackUne,
  checkBackBs7074,
  ...codeMinimumChecks,
  equalShares('V_t'),
  fullWeight,
  glycolUncertainty,
]

export const methods: Readonly<Record<string, Method>> = Object.fromEntries(all.map((method) => [method.id, method]))

/** Methods that size a vessel of a kind, by the name a spec gives them, in order of choice. */
export const methodsFor = (kind: string, method: string): readonly Method[] =>
  all.filter((candidate) => candidate.vessel?.kind === kind && candidate.vessel.method === method)

/** Names of the methods for a kind, first the default. */
export const methodNames = (kind: string): readonly string[] => [
  ...new Set(all.filter((m) => m.vessel?.kind === kind).map((m) => m.vessel?.method ?? '')),
]
