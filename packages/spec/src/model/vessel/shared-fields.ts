import { choice, integer, quantity, text, yesNo } from '../field.ts'
import { pressureReading } from '../system.ts'

const quantityField = integer(1, 'Number of equal vessels that share the volume.', '1', { fallback: '1' })

/** Keys of every vessel. `kind` and `selection` are keys of every vessel too and are read apart. */
export const common = {
  quantity: quantityField,
  serves: text('What the vessel serves, for the schedule.', 'Boilers B-1 and B-2', {
    fallback: 'the title of the system',
  }),
  location: text('Where the vessel stands.', 'Mechanical room 012'),
  note: text('A remark printed under the schedule.', 'Mount on the suction header'),
  mounting: choice(
    { hung: 'hung from the piping or on a wall', floor: 'stands on the floor', 'in line': 'carried by the pipe' },
    'How the vessel is carried. Only catalogue rows with this mounting are chosen.',
    'floor',
    { fallback: 'any' },
  ),
  stamp: yesNo(
    'Whether the vessel has to carry the stamp of the pressure vessel code. Only such catalogue rows are then chosen.',
    'yes',
    { fallback: 'only where its volume, pressure or temperature asks for it' },
  ),
}

export const material = choice(
  {
    steel: 'growth of steel pipe is credited',
    copper: 'growth of copper pipe is credited',
    none: 'no credit, as for plastic pipe',
  },
  'What most of the piping is made of. Pipe that grows with heat makes room for water.',
  'steel',
  { fallback: 'steel, and then an assumption' },
)

export const closedConstruction = choice(
  { diaphragm: 'gas and water parted by a fixed diaphragm', bladder: 'water held in a bladder that can be replaced' },
  'How gas and water are kept apart.',
  'diaphragm',
  { fallback: 'diaphragm' },
)

export const precharge = quantity(pressureReading, 'Pressure of the gas when the vessel is empty of water.', '22 psi', {
  fallback: 'the pressure at which the vessel starts to take water',
  positive: true,
})

export const reliefMargin = quantity(
  ['ratio', 'pressure difference'],
  'How far below the relief valve this vessel stays. It replaces the margin of the system.',
  '10 %',
  { fallback: 'the relief-margin of the system', least: 0 },
)

export const usableFraction = quantity(['ratio'], 'Part of the volume that can be used.', '70 %', {
  fallback: '70 % where the method asks for it, and then an assumption',
  positive: true,
})

export const solarContents = {
  'collector-volume': quantity(['volume'], 'Content of all collectors.', '12 L', { required: true, positive: true }),
  'piping-above': quantity(['volume'], 'Content of the pipes that stand above the collector connection.', '6 L', {
    required: true,
    least: 0,
  }),
}
