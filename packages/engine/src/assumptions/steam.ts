import { defineAssumption } from '../assumption.ts'
import { cite, citeFromMemory } from '../citation.ts'
import { ashraeHvacSe } from '../sources/ashrae-hvac-se.ts'
import { commonPractice } from '../sources/common-practice.ts'
import { nb27 } from '../sources/nb-27.ts'
import { steamColumnist } from '../sources/steam-columnist.ts'

export const flashVelocity = defineAssumption({
  id: 'flash-tank.steam-velocity',
  name: 'highest velocity of flash steam in the tank',
  kind: 'velocity',
  value: '10 ft/s',
  source: citeFromMemory(ashraeHvacSe, 'steam systems, flash tanks'),
  because: 'Not stated. Faster steam carries water with it.',
  overriddenBy: 'systems.*.vessels.*.steam-velocity',
})

export const blowdownLevelDrop = defineAssumption({
  id: 'blowdown.level-drop',
  name: 'drop of the water level in one blow',
  kind: 'length',
  value: '4 in',
  source: citeFromMemory(nb27, 'volume blown: drop of the level of 4 in at least'),
  because: 'Not stated. The least drop that the guide counts with.',
  overriddenBy: 'systems.*.vessels.*.level-drop',
})

export const blowdownDrainTemperature = defineAssumption({
  id: 'blowdown.drain-temperature',
  name: 'hottest water that the drain may take',
  kind: 'temperature',
  value: '140 °F',
  source: citeFromMemory(nb27, 'outlet cooled to 140 to 150 °F'),
  because: 'Not stated. The lower figure is usual in plumbing codes; the limit of the local sewer governs.',
  overriddenBy: 'systems.*.vessels.*.drain-temperature',
})

export const blowdownCoolingWater = defineAssumption({
  id: 'blowdown.cooling-water',
  name: 'temperature of the water that cools the blowdown',
  kind: 'temperature',
  value: '60 °F',
  source: cite(commonPractice, 'water of the main in summer'),
  because: 'Warmer water cools less, so more of it is needed; use the summer temperature of the main.',
  overriddenBy: 'assumptions',
})

export const condensateTemperature = defineAssumption({
  id: 'condensate.temperature',
  name: 'temperature of the condensate',
  kind: 'temperature',
  value: '212 °F',
  source: cite(commonPractice, 'vented receiver'),
  because: 'A vented receiver is near the boiling point; hotter water takes the greater volume.',
  overriddenBy: 'assumptions',
})

export const condensateDuty = defineAssumption({
  id: 'condensate.duty',
  name: 'duty of the condensate receiver',
  kind: 'words',
  choices: ['condensate'],
  value: 'condensate',
  source: cite(commonPractice, 'the receiver returns condensate'),
  because: 'Not stated. A receiver that feeds the boiler is many times larger: write `duty: boiler feed`.',
  overriddenBy: 'systems.*.vessels.*.duty',
})

export const condensatePumpFactor = defineAssumption({
  id: 'condensate.pump-factor',
  name: 'flow of the condensate pump, as a multiple of the steaming rate',
  kind: 'count',
  value: '3',
  source: cite(steamColumnist, 'pump at three times the steaming rate'),
  because: 'Not stated. Condensate comes in rushes, most of all when the system starts.',
  overriddenBy: 'systems.*.vessels.*.pump-factor',
})

export const condensateHolding = defineAssumption({
  id: 'condensate.holding-time',
  name: 'time for which the receiver holds the flow of its pump',
  kind: 'time',
  value: '1 min',
  source: cite(steamColumnist, 'receiver of one minute of the pump'),
  because: 'Not stated. The usual proportion of receiver and pump.',
  overriddenBy: 'systems.*.vessels.*.holding-time',
})

export const condensateUsable = defineAssumption({
  id: 'condensate.usable-fraction',
  name: 'usable part of a condensate receiver',
  kind: 'ratio',
  value: '100 %',
  source: cite(steamColumnist, 'receiver of one minute of the pump'),
  because: 'Not stated. The rule of one minute speaks of the whole receiver.',
  overriddenBy: 'systems.*.vessels.*.usable-fraction',
})

export const boilerFeedHolding = defineAssumption({
  id: 'boiler-feed.holding-time',
  name: 'time for which a boiler feed receiver holds the evaporation',
  kind: 'time',
  value: '20 min',
  source: cite(commonPractice, 'a third to half an hour of evaporation, in a reprint; 10 to 20 min are used too'),
  because: 'Not stated. A third of an hour; spread systems, whose condensate is slow to return, take half an hour.',
  overriddenBy: 'systems.*.vessels.*.holding-time',
})

export const boilerFeedUsable = defineAssumption({
  id: 'boiler-feed.usable-fraction',
  name: 'usable part of a boiler feed receiver',
  kind: 'ratio',
  value: '75 %',
  source: cite(commonPractice, '75 % usable, in a reprint'),
  because: 'Not stated. Water below the pump suction and room above the float cannot be used.',
  overriddenBy: 'systems.*.vessels.*.usable-fraction',
})

export const boilerFeedPumpFactor = defineAssumption({
  id: 'boiler-feed.pump-factor',
  name: 'flow of the boiler feed pump, as a multiple of the steaming rate',
  kind: 'count',
  value: '2',
  source: citeFromMemory(commonPractice, 'feed pump that starts and stops by the level of the boiler'),
  because: 'Not stated. A pump that starts and stops takes some twice the evaporation; one that runs on takes less.',
  overriddenBy: 'systems.*.vessels.*.pump-factor',
})
