import { defineAssumption } from '../assumption.ts'
import { cite, citeFromMemory } from '../citation.ts'
import { ashraeServiceWater } from '../sources/ashrae-service-water.ts'
import { aspeHotWater } from '../sources/aspe-hot-water.ts'
import { commonPractice } from '../sources/common-practice.ts'
import { din4708Part2 } from '../sources/din-4708-2.ts'

export const storageColdWater = defineAssumption({
  id: 'storage.cold-water',
  name: 'coldest water that enters the heater',
  kind: 'temperature',
  value: '40 °F',
  source: cite(commonPractice, 'incoming water of the coldest month'),
  because: 'Not stated. It moves the heat input only: colder water takes more heat.',
  overriddenBy: 'systems.*.temperatures.cold',
})

export const storageTemperature = defineAssumption({
  id: 'storage.temperature',
  name: 'temperature of the stored water',
  kind: 'temperature',
  value: '140 °F',
  source: citeFromMemory(ashraeServiceWater, 'demand tables, water at 140 °F'),
  because: 'Not stated. The demand tables hold for water at 140 °F (60 °C), which also keeps legionella down.',
  overriddenBy: 'systems.*.temperatures.storage',
})

export const usableFraction = defineAssumption({
  id: 'storage.usable-fraction',
  name: 'usable part of a storage tank',
  kind: 'ratio',
  value: '70 %',
  source: cite(aspeHotWater, 'method 1; 60 to 80 % by the shape of the tank'),
  because:
    'Not stated. Cold water mixes in as hot water is drawn; some 70 % comes out hot. A larger fraction makes the tank smaller.',
  overriddenBy: 'systems.*.vessels.*.usable-fraction',
})

export const demandLevel = defineAssumption({
  id: 'storage.demand-level',
  name: 'how much a person draws',
  kind: 'words',
  choices: ['low', 'medium', 'high'],
  value: 'medium',
  source: citeFromMemory(ashraeServiceWater, 'table of low, medium and high guidelines per person'),
  because: 'Not stated. High is some 1.8 times medium, low some 0.6 times.',
  overriddenBy: 'systems.*.vessels.*.demand-level',
})

export const peakTime = defineAssumption({
  id: 'storage.peak-time',
  name: 'length of the peak that the store carries',
  kind: 'time',
  value: '30 min',
  source: cite(commonPractice, 'the store carries half an hour of the morning peak'),
  because:
    'Not stated. A longer peak makes a larger store and a smaller heater; both together carry the day in any case.',
  overriddenBy: 'systems.*.vessels.*.peak-time',
})

export const fixtureDemandRange = defineAssumption({
  id: 'storage.fixture-demand-range',
  name: 'figure taken where the fixture table gives a range',
  kind: 'words',
  choices: ['greatest', 'middle', 'least'],
  value: 'greatest',
  source: citeFromMemory(ashraeServiceWater, 'table of the hot-water demand per fixture, ranges for dishwashers'),
  because:
    'The table gives a range for dishwashers outside dwellings. The greatest figure makes the tank larger, never smaller; use the data of the machine where it is chosen.',
  overriddenBy: 'assumptions',
})

export const fixtureDemandAge = defineAssumption({
  id: 'storage.fixture-demand-age',
  name: 'age of the fixture demand',
  kind: 'words',
  choices: ['as tabled'],
  value: 'as tabled',
  source: citeFromMemory(ashraeServiceWater, 'table of the hot-water demand per fixture, gal/h at 140 °F'),
  because:
    'The fixture data predate low-flow fixtures, so the result is usually high. No reduction is taken; measured data of a like building govern.',
  overriddenBy: 'assumptions',
})

export const apartmentStorageFactor = defineAssumption({
  id: 'storage.apartment-storage-factor',
  name: 'storage per demand of the busiest hour, apartments',
  kind: 'ratio',
  value: '125 %',
  source: cite(ashraeServiceWater, 'storage capacity factor of apartment houses'),
  because:
    'The table per apartment gives the busiest hour but no storage; the factor for apartment houses of the fixture table refers to that hour.',
  overriddenBy: 'assumptions',
})

export const dwellingPeople = defineAssumption({
  id: 'storage.dwelling-people',
  name: 'people in a dwelling, din 4708',
  kind: 'count',
  value: '3.5',
  source: cite(din4708Part2, 'standard dwelling of four rooms'),
  because: 'The spec gives a number of apartments and no index, so each counts as a standard dwelling.',
  overriddenBy: 'systems.*.vessels.*.demand-index',
})

export const dwellingDraw = defineAssumption({
  id: 'storage.dwelling-draw',
  name: 'heat of the largest draw in a dwelling, din 4708',
  kind: 'energy',
  value: '5820 Wh',
  source: cite(din4708Part2, 'bath of the standard dwelling'),
  because: 'The spec gives a number of apartments and no index, so each counts as a standard dwelling with one bath.',
  overriddenBy: 'systems.*.vessels.*.demand-index',
})
