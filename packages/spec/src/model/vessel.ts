import type { VesselKindDefinition } from './vessel/definition.ts'
import { breakTank } from './vessel/break-tank.ts'
import { bufferTank } from './vessel/buffer-tank.ts'
import { expansionTank } from './vessel/expansion-tank.ts'
import { glycolFeeder } from './vessel/glycol-feeder.ts'
import { pressureTank } from './vessel/pressure-tank.ts'
import { airAndDirtSeparator, hydraulicSeparator } from './vessel/separators.ts'
import { drainBackTank, solarExpansionTank } from './vessel/solar-vessels.ts'
import { blowdownSeparator, condensateReceiver, flashTank } from './vessel/steam-vessels.ts'
import { storageTank } from './vessel/storage-tank.ts'
import { thermalExpansionTank } from './vessel/thermal-expansion-tank.ts'

export type { Need, VesselKindDefinition } from './vessel/definition.ts'

/** Every kind of vessel that the language knows. Which of them this version sizes is said by the vocabulary. */
export const vesselKinds = {
  'expansion tank': expansionTank,
  'thermal expansion tank': thermalExpansionTank,
  'storage tank': storageTank,
  'buffer tank': bufferTank,
  'pressure tank': pressureTank,
  'solar expansion tank': solarExpansionTank,
  'glycol feeder': glycolFeeder,
  'air and dirt separator': airAndDirtSeparator,
  'hydraulic separator': hydraulicSeparator,
  'drain-back tank': drainBackTank,
  'flash tank': flashTank,
  'blowdown separator': blowdownSeparator,
  'condensate receiver': condensateReceiver,
  'break tank': breakTank,
} satisfies Record<string, VesselKindDefinition>

export type VesselKind = keyof typeof vesselKinds
export type VesselFieldsOf<K extends VesselKind> = (typeof vesselKinds)[K]['fields']

export const vesselKindNames = Object.keys(vesselKinds) as readonly VesselKind[]

export const isVesselKind = (name: string): name is VesselKind => Object.hasOwn(vesselKinds, name)
