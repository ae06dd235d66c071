import { defineAssumption } from '../assumption.ts'
import { cite } from '../citation.ts'
import { chillerPractice } from '../sources/chiller-practice.ts'
import { commonPractice } from '../sources/common-practice.ts'

export const bufferLoadMinimum = defineAssumption({
  id: 'buffer.load-minimum',
  name: 'least load that can call alone',
  kind: 'power',
  value: '0 kW',
  source: cite(commonPractice, 'no load taken into account'),
  because: 'Not stated. Without a load the tank comes out larger, never smaller.',
  overriddenBy: 'systems.*.vessels.*.load-minimum',
})

export const bufferCredit = defineAssumption({
  id: 'buffer.credit',
  name: 'water of the circuit that always flows',
  kind: 'volume',
  value: '0 L',
  source: cite(commonPractice, 'no water of the circuit credited'),
  because: 'Not stated. Without a credit the tank comes out larger, never smaller.',
  overriddenBy: 'systems.*.vessels.*.credit',
})

export const bufferVolumePerTon = defineAssumption({
  id: 'buffer.volume-per-ton',
  name: 'water of a chilled loop for each ton of cooling',
  kind: 'volume per power',
  value: '6 gal/ton',
  source: cite(chillerPractice, '3 to 6 gal a ton for comfort, 6 to 10 for process cooling'),
  because: 'Not stated. The upper figure for comfort cooling; the machine’s stated least loop volume governs.',
  overriddenBy: 'systems.*.vessels.*.volume-per-ton',
})
