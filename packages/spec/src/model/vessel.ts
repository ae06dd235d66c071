import { choice, type Fields, integer, number, quantity, text, yesNo } from './field.ts'
import { hydronicServices, pressureReading, type Service } from './system.ts'

/**
 * An input without which the vessel has no size: one of `keys` must be there. A key is a path inside the system
 * (`temperatures.high`), or begins with `vessel.` and is a key of the vessel. `only` and `unless` narrow the need to some
 * values of a key of the vessel; an empty text stands for a key that is not written.
 */
export interface Need {
  readonly keys: readonly [string, ...string[]]
  /** What it is for, after the words "ET-1 needs … ": "to know how hot the water gets". */
  readonly to: string
  readonly only?: { readonly key: string; readonly is: readonly string[] }
  readonly unless?: { readonly key: string; readonly is: readonly string[] }
  /** Keys of the vessel that ask for another method, so that this need does not hold. */
  readonly liftedBy?: readonly string[]
}

export interface VesselKindDefinition {
  /** For headings: "Expansion tanks". */
  readonly title: string
  readonly doc: string
  /** A whole vessel in one line, as in `ET-1: { … }`. */
  readonly example: string
  readonly services: readonly Service[]
  readonly fields: Fields
  readonly needs: readonly Need[]
}

const quantityField = integer(1, 'Number of equal vessels that share the volume.', '1', { fallback: '1' })

/** Keys of every vessel. `kind` and `selection` are keys of every vessel too and are read apart. */
const common = {
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

const material = choice(
  {
    steel: 'growth of steel pipe is credited',
    copper: 'growth of copper pipe is credited',
    none: 'no credit, as for plastic pipe',
  },
  'What most of the piping is made of. Pipe that grows with heat makes room for water.',
  'steel',
  { fallback: 'steel, and then an assumption' },
)

const closedConstruction = choice(
  { diaphragm: 'gas and water parted by a fixed diaphragm', bladder: 'water held in a bladder that can be replaced' },
  'How gas and water are kept apart.',
  'diaphragm',
  { fallback: 'diaphragm' },
)

const precharge = quantity(pressureReading, 'Pressure of the gas when the vessel is empty of water.', '22 psi', {
  fallback: 'the pressure at which the vessel starts to take water',
  positive: true,
})

const reliefMargin = quantity(
  ['ratio', 'pressure difference'],
  'How far below the relief valve this vessel stays. It replaces the margin of the system.',
  '10 %',
  { fallback: 'the relief-margin of the system', least: 0 },
)

const usableFraction = quantity(['ratio'], 'Part of the volume that can be used.', '70 %', {
  fallback: '70 % where the method asks for it, and then an assumption',
  positive: true,
})

const solarContents = {
  'collector-volume': quantity(['volume'], 'Content of all collectors.', '12 L', { required: true, positive: true }),
  'piping-above': quantity(['volume'], 'Content of the pipes that stand above the collector connection.', '6 L', {
    required: true,
    least: 0,
  }),
}

const drinkingWater: readonly Service[] = ['domestic hot water', 'domestic cold water']

/** Every kind of vessel that the language knows. Which of them this version sizes is said by the vocabulary. */
export const vesselKinds = {
  'expansion tank': {
    title: 'Expansion tanks',
    doc: 'Takes up the growth of the water in a closed or open heating or cooling loop.',
    example: '{ kind: expansion tank, construction: bladder, method: ashrae }',
    services: hydronicServices,
    fields: {
      ...common,
      construction: choice(
        {
          diaphragm: 'closed, gas and water parted by a fixed diaphragm',
          bladder: 'closed, water held in a bladder that can be replaced',
          'plain steel': 'closed, gas and water meet',
          open: 'open to the air, above the highest point of the system',
        },
        'How the vessel is built. It decides the formula.',
        'bladder',
        { fallback: 'diaphragm' },
      ),
      method: choice(
        {
          ashrae: 'growth of the water less growth of the pipes, gas law between fill and maximum pressure',
          'en 12828': 'European standard for heating systems in buildings, with a water reserve',
          'din 4807': 'German standard for closed heating systems, expansion counted from 10 °C',
          'une 100155': 'Spanish standard, with its own expansion coefficient',
          'bs 7074': 'British standard, with a check of the final pressure',
          'code minimum': 'least volume in the mechanical code, a legal floor and not a design method',
        },
        'Method by which the vessel is sized. The method moves the answer by up to 40 %.',
        'ashrae',
        { fallback: 'ashrae' },
      ),
      material,
      precharge,
      'relief-margin': reliefMargin,
    },
    needs: [
      { keys: ['contents'], to: 'to know how much water expands' },
      { keys: ['temperatures.high'], to: 'to know how hot the water gets' },
      { keys: ['temperatures.low', 'temperatures.fill'], to: 'to know how cold the water gets' },
      {
        keys: ['pressure.static-height', 'pressure.fill'],
        to: 'to know the fill pressure',
        unless: { key: 'construction', is: ['open'] },
      },
      {
        keys: ['pressure.relief-valve', 'pressure.maximum'],
        to: 'to know the highest pressure allowed',
        unless: { key: 'construction', is: ['open'] },
      },
    ],
  },
  'thermal expansion tank': {
    title: 'Thermal expansion tanks',
    doc: 'Takes up the growth of heated drinking water behind a backflow preventer or check valve.',
    example: '{ kind: thermal expansion tank }',
    services: ['domestic hot water'],
    fields: {
      ...common,
      construction: closedConstruction,
      method: choice(
        {
          aspe: 'growth of the water less growth of tank and pipes, gas law between supply and maximum pressure',
          ashrae: 'the same by the equations of the handbook',
          'din 4807-5': 'German standard for vessels in drinking water systems',
        },
        'Method by which the vessel is sized.',
        'aspe',
        { fallback: 'aspe' },
      ),
      material: choice(
        {
          steel: 'growth of steel is credited for contents that name no material',
          copper: 'growth of copper is credited for contents that name no material',
          none: 'no growth is credited for contents that name no material',
        },
        'What the heater and pipes are made of where the contents do not say.',
        'none',
        { fallback: 'none, and then an assumption' },
      ),
      precharge,
      'relief-margin': reliefMargin,
    },
    needs: [
      { keys: ['contents'], to: 'to know how much water is heated' },
      { keys: ['temperatures.cold'], to: 'to know how cold the water comes in' },
      { keys: ['temperatures.storage'], to: 'to know how hot the water is stored' },
      { keys: ['pressure.regulator', 'pressure.supply'], to: 'to know the pressure at the vessel' },
      { keys: ['pressure.relief-valve', 'pressure.maximum'], to: 'to know the highest pressure allowed' },
    ],
  },
  'storage tank': {
    title: 'Storage tanks',
    doc: 'Stores hot water for the peak.',
    example: '{ kind: storage tank, method: ashrae fixture }',
    services: ['domestic hot water'],
    fields: {
      ...common,
      method: choice(
        {
          'ashrae fixture': 'hourly demand of the fixtures, demand factor, storage factor',
          'aspe fixture': 'the same, divided by the usable fraction',
          'per person': 'volume that a person draws in the peak',
          'per apartment': 'hourly demand of an apartment by the number of apartments',
          'recovery and storage': 'readings from a curve of recovery against storage, typed by you',
          'din 4708': 'German standard, demand index N of a group of dwellings',
        },
        'Method by which storage and recovery are found. Two methods may differ by 40 %.',
        'ashrae fixture',
        { required: true },
      ),
      'usable-fraction': usableFraction,
      'demand-level': choice(
        { low: 'few draw at once', medium: 'usual', high: 'many draw at once' },
        'How heavy the demand of a person is.',
        'medium',
        { fallback: 'medium' },
      ),
      'peak-time': quantity(['time'], 'Length of the peak that the store carries.', '30 min', { positive: true }),
      recovery: quantity(['hourly flow'], 'Reading of the curve: recovery for each unit served.', '1.1 gph', {
        positive: true,
      }),
      storage: quantity(['volume'], 'Reading of the curve: usable storage for each unit served.', '12 gal', {
        positive: true,
      }),
      'units-served': integer(
        1,
        'Number of people, beds or apartments to which the readings of the curve apply.',
        '300',
      ),
      'demand-index': number('Demand index N of the dwellings, where it is known.', '12', { least: 0 }),
    },
    needs: [
      {
        keys: ['demand.fixtures'],
        to: 'to know what draws hot water',
        only: { key: 'method', is: ['ashrae fixture', 'aspe fixture'] },
      },
      {
        keys: ['demand.building'],
        to: 'to know which row of the demand table holds',
        only: { key: 'method', is: ['ashrae fixture', 'aspe fixture'] },
      },
      {
        keys: ['vessel.recovery'],
        to: 'to be sized from a curve',
        only: { key: 'method', is: ['recovery and storage'] },
      },
      {
        keys: ['vessel.storage'],
        to: 'to be sized from a curve',
        only: { key: 'method', is: ['recovery and storage'] },
      },
      {
        keys: ['vessel.units-served', 'demand.people', 'demand.apartments'],
        to: 'to know how many the readings of the curve hold for',
        only: { key: 'method', is: ['recovery and storage'] },
      },
      {
        keys: ['vessel.demand-index', 'demand.apartments'],
        to: 'to be sized by din 4708',
        only: { key: 'method', is: ['din 4708'] },
      },
      { keys: ['demand.people'], to: 'to know how many draw hot water', only: { key: 'method', is: ['per person'] } },
      {
        keys: ['demand.apartments'],
        to: 'to know how many draw hot water',
        only: { key: 'method', is: ['per apartment'] },
      },
    ],
  },
  'buffer tank': {
    title: 'Buffer tanks',
    doc: 'Adds water to a loop so that the source does not start too often.',
    example:
      '{ kind: buffer tank, source-minimum: 96 MBH, load-minimum: 10 MBH, run-time: 10 min, temperature-band: 20 °F }',
    services: hydronicServices,
    fields: {
      ...common,
      method: choice(
        {
          'run time': 'holds what the source makes beyond the load in its least run time',
          'volume per ton': 'water of the whole loop for each ton of cooling',
          'en 303-5': 'store of a solid fuel boiler that burns one charge',
          defrost: 'holds the heat that a heat pump takes to defrost',
        },
        'Method by which the vessel is sized.',
        'run time',
        { fallback: 'the method whose keys are given' },
      ),
      'source-minimum': quantity(['power'], 'Least output of the smallest source.', '96 MBH', { positive: true }),
      'load-minimum': quantity(['power'], 'Least load that can call alone.', '10 MBH', {
        fallback: 'none, and then an assumption',
        least: 0,
      }),
      'run-time': quantity(['time'], 'Least time that the source runs once it has started.', '10 min', {
        positive: true,
      }),
      'temperature-band': quantity(
        ['temperature difference'],
        'Change of temperature of the buffer between start and stop of the source.',
        '20 °F',
        {
          positive: true,
        },
      ),
      credit: quantity(['volume'], 'Water of the circuit that always flows. It is taken off.', '60 gal', {
        fallback: 'none',
        least: 0,
      }),
      'cooling-capacity': quantity(['power'], 'Capacity of the chillers that run.', '40 ton', { positive: true }),
      'volume-per-ton': quantity(['volume per power'], 'Water of the loop for each unit of cooling.', '6 gal/ton', {
        positive: true,
      }),
      'boiler-output': quantity(['power'], 'Rated output of the solid fuel boiler.', '30 kW', { positive: true }),
      'boiler-minimum': quantity(['power'], 'Least output of the solid fuel boiler.', '15 kW', { positive: true }),
      'heat-load': quantity(['power'], 'Design heat load of the building.', '25 kW', { positive: true }),
      'burn-time': quantity(['time'], 'Time that one charge of fuel burns.', '5 h', { positive: true }),
      'defrost-energy': quantity(['energy'], 'Heat that one defrost takes.', '3 kWh', { positive: true }),
    },
    needs: [
      ...(['vessel.source-minimum', 'vessel.run-time', 'vessel.temperature-band'] as const).flatMap((key): Need[] => [
        { keys: [key], to: 'to be sized by run time', only: { key: 'method', is: ['run time'] } },
        {
          keys: [key],
          to: 'to be sized by run time',
          only: { key: 'method', is: [''] },
          liftedBy: ['cooling-capacity', 'boiler-output', 'defrost-energy'],
        },
      ]),
      {
        keys: ['vessel.cooling-capacity'],
        to: 'to be sized by volume per ton',
        only: { key: 'method', is: ['volume per ton'] },
      },
      ...(['vessel.boiler-output', 'vessel.boiler-minimum', 'vessel.heat-load', 'vessel.burn-time'] as const).map(
        (key): Need => ({ keys: [key], to: 'to be sized by en 303-5', only: { key: 'method', is: ['en 303-5'] } }),
      ),
      ...(['vessel.defrost-energy', 'vessel.temperature-band'] as const).map((key): Need => ({
        keys: [key],
        to: 'to be sized for defrost',
        only: { key: 'method', is: ['defrost'] },
      })),
    ],
  },
  'pressure tank': {
    title: 'Pressure tanks',
    doc: 'Gives water between two starts of a pump.',
    example: '{ kind: pressure tank, pump-flow: 50 gpm, starts-per-hour: 6 }',
    services: ['domestic cold water'],
    fields: {
      ...common,
      construction: closedConstruction,
      method: choice(
        {
          drawdown: 'the drawdown is given',
          'run time': 'the flow of the pump for its least run time',
          'starts per hour': 'a quarter of a cycle at half the flow of the pump',
          'off time': 'the least demand while variable-speed pumps stay off',
          'ten states': 'ten minutes of the largest pump, for public water systems',
        },
        'How the drawdown is found.',
        'starts per hour',
        { fallback: 'the method whose keys are given' },
      ),
      'pump-flow': quantity(['flow'], 'Flow of one pump at cut-in.', '50 gpm', { positive: true }),
      'starts-per-hour': number('Most starts of the pump in an hour.', '6', { least: 0 }),
      'run-time': quantity(['time'], 'Least time that the pump runs.', '2 min', { positive: true }),
      drawdown: quantity(['volume'], 'Water given between cut-out and cut-in.', '25 gal', { positive: true }),
      'low-demand': quantity(['flow'], 'Least demand, at which variable-speed pumps stop.', '4 gpm', {
        positive: true,
      }),
      'off-time': quantity(['time'], 'Time for which the pumps stay off at the least demand.', '5 min', {
        positive: true,
      }),
      precharge: quantity(pressureReading, 'Pressure of the gas when the vessel is empty of water.', '38 psi', {
        fallback: '2 psi below cut-in, and then an assumption',
        positive: true,
      }),
    },
    needs: [
      { keys: ['vessel.pump-flow', 'vessel.drawdown', 'vessel.low-demand'], to: 'to know the drawdown' },
      {
        keys: ['vessel.starts-per-hour', 'vessel.run-time', 'vessel.drawdown', 'vessel.off-time'],
        to: 'to know the drawdown',
        only: { key: 'method', is: [''] },
      },
      { keys: ['vessel.drawdown'], to: 'to be sized by drawdown', only: { key: 'method', is: ['drawdown'] } },
      { keys: ['vessel.run-time'], to: 'to be sized by run time', only: { key: 'method', is: ['run time'] } },
      {
        keys: ['vessel.starts-per-hour'],
        to: 'to be sized by starts per hour',
        only: { key: 'method', is: ['starts per hour'] },
      },
      ...(['vessel.low-demand', 'vessel.off-time'] as const).map((key): Need => ({
        keys: [key],
        to: 'to be sized by off time',
        only: { key: 'method', is: ['off time'] },
      })),
      { keys: ['vessel.pump-flow'], to: 'to be sized by ten states', only: { key: 'method', is: ['ten states'] } },
      { keys: ['pressure.cut-in'], to: 'to know when the pump starts' },
      { keys: ['pressure.cut-out'], to: 'to know when the pump stops' },
    ],
  },
  'solar expansion tank': {
    title: 'Solar expansion tanks',
    doc: 'Takes up the growth of the fluid in a solar loop and the content of the collectors when they boil.',
    example: '{ kind: solar expansion tank, collector-volume: 12 L, piping-above: 6 L }',
    services: ['solar thermal'],
    fields: {
      ...common,
      method: choice(
        {
          idae: 'growth of the fluid, content of collectors that boil, reserve; gas law with a floor of two',
        },
        'Method by which the vessel is sized.',
        'idae',
        { fallback: 'idae' },
      ),
      ...solarContents,
      construction: closedConstruction,
      'expansion-fraction': quantity(['ratio'], 'Growth of the fluid as a part of the contents.', '8.5 %', {
        fallback: '8.5 %, and then an assumption',
        positive: true,
      }),
      'water-reserve': quantity(['volume'], 'Fluid kept in the vessel when the loop is cold.', '3 L', {
        fallback: '3 L, and then an assumption',
        least: 0,
      }),
      precharge,
      'relief-margin': reliefMargin,
    },
    needs: [
      { keys: ['contents'], to: 'to know how much fluid expands' },
      { keys: ['pressure.static-height', 'pressure.fill'], to: 'to know the fill pressure' },
      { keys: ['pressure.relief-valve', 'pressure.maximum'], to: 'to know the highest pressure allowed' },
    ],
  },
  'glycol feeder': {
    title: 'Glycol feeders',
    doc: 'A tank and pump that make up a glycol loop.',
    example: '{ kind: glycol feeder, make-up: 3 %, drum: 55 gal }',
    services: hydronicServices,
    fields: {
      ...common,
      method: choice(
        {
          'make-up': 'the larger of a part of the contents and one drum',
        },
        'Method by which the vessel is sized.',
        'make-up',
        { fallback: 'make-up' },
      ),
      'make-up': quantity(['ratio'], 'Make-up held, as a part of the contents of the system.', '3 %', {
        positive: true,
      }),
      drum: quantity(['volume'], 'Content of the drum from which the tank is filled.', '55 gal', { positive: true }),
      'pump-flow': quantity(['flow'], 'Flow of the feed pump.', '1.5 gpm', { positive: true }),
    },
    needs: [{ keys: ['contents'], to: 'to know how much fluid is made up' }],
  },
  'air and dirt separator': {
    title: 'Air and dirt separators',
    doc: 'Takes air bubbles, dirt or both out of the flow.',
    example: '{ kind: air and dirt separator, flow: 100 gpm }',
    services: hydronicServices,
    fields: {
      ...common,
      method: choice(
        {
          'entering velocity': 'bore at which the inlet velocity is kept',
        },
        'Method by which the vessel is sized.',
        'entering velocity',
        { fallback: 'entering velocity' },
      ),
      removes: choice(
        { air: 'air only', dirt: 'dirt only', 'air and dirt': 'both' },
        'What it takes out of the flow.',
        'air and dirt',
        { fallback: 'air and dirt' },
      ),
      flow: quantity(['flow'], 'Design flow through the separator.', '100 gpm', { required: true, positive: true }),
      'entering-velocity': quantity(['velocity'], 'Highest velocity at the inlet.', '4 ft/s', { positive: true }),
    },
    needs: [],
  },
  'hydraulic separator': {
    title: 'Hydraulic separators',
    doc: 'Parts the flow of the sources from the flow of the loads.',
    example: '{ kind: hydraulic separator, source-flow: 80 gpm, load-flow: 100 gpm }',
    services: hydronicServices,
    fields: {
      ...common,
      method: choice(
        {
          'body velocity': 'diameter at which the velocity in the body is kept',
        },
        'Method by which the vessel is sized.',
        'body velocity',
        { fallback: 'body velocity' },
      ),
      'source-flow': quantity(['flow'], 'Design flow on the side of the sources.', '80 gpm', {
        required: true,
        positive: true,
      }),
      'load-flow': quantity(['flow'], 'Design flow on the side of the loads.', '100 gpm', {
        required: true,
        positive: true,
      }),
      'body-velocity': quantity(['velocity'], 'Highest velocity in the body.', '0.4 ft/s', { positive: true }),
    },
    needs: [],
  },
  'drain-back tank': {
    title: 'Drain-back tanks',
    doc: 'Takes the content of the collectors when the pump stops.',
    example: '{ kind: drain-back tank, collector-volume: 10 gal, piping-above: 4 gal }',
    services: ['solar thermal'],
    fields: {
      ...common,
      method: choice(
        {
          'contents above': 'collectors, piping above and reserve',
        },
        'Method by which the vessel is sized.',
        'contents above',
        { fallback: 'contents above' },
      ),
      ...solarContents,
      'water-reserve': quantity(['volume'], 'Water that stays in the tank when the loop is full.', '5 gal', {
        least: 0,
      }),
    },
    needs: [],
  },
  'flash tank': {
    title: 'Flash tanks',
    doc: 'Lets hot condensate flash at a lower pressure.',
    example: '{ kind: flash tank, condensate-flow: 2000 lb/h, condensate-pressure: 100 psi, flash-pressure: 5 psi }',
    services: ['steam'],
    fields: {
      ...common,
      method: choice(
        {
          'steam velocity': 'diameter at which the velocity of the flash steam is kept',
        },
        'Method by which the vessel is sized.',
        'steam velocity',
        { fallback: 'steam velocity' },
      ),
      'condensate-flow': quantity(['mass flow'], 'Condensate that enters.', '2000 lb/h', {
        required: true,
        positive: true,
      }),
      'condensate-pressure': quantity(
        ['gauge pressure'],
        'Pressure of the steam that the condensate comes from.',
        '100 psi',
        {
          required: true,
          positive: true,
        },
      ),
      'flash-pressure': quantity(['gauge pressure'], 'Pressure in the flash tank.', '5 psi', {
        required: true,
        least: 0,
      }),
      'steam-velocity': quantity(['velocity'], 'Highest velocity of the flash steam in the tank.', '10 ft/s', {
        positive: true,
      }),
    },
    needs: [],
  },
  'blowdown separator': {
    title: 'Blowdown separators',
    doc: 'Cools and vents the water that is blown out of a steam boiler.',
    example: '{ kind: blowdown separator, blown-volume: 60 gal, boiler-pressure: 100 psi }',
    services: ['steam'],
    fields: {
      ...common,
      method: choice(
        {
          'blown volume': 'twice the volume blown',
          'level drop': 'twice the volume of a drop of the boiler level',
        },
        'Method by which the vessel is sized.',
        'blown volume',
        { fallback: 'the method whose keys are given' },
      ),
      'blown-volume': quantity(['volume'], 'Water blown out at once.', '60 gal', { positive: true }),
      'water-surface': quantity(['area'], 'Area of the water surface in the boiler at its normal level.', '48 ft2', {
        positive: true,
      }),
      'level-drop': quantity(['length'], 'Drop of the water level in one blow.', '4 in', { positive: true }),
      'boiler-pressure': quantity(['gauge pressure'], 'Working pressure of the boiler.', '100 psi', {
        required: true,
        positive: true,
      }),
      'drain-temperature': quantity(['temperature'], 'Hottest water that the drain may take.', '140 °F'),
    },
    needs: [{ keys: ['vessel.blown-volume', 'vessel.water-surface'], to: 'to know how much water is blown out' }],
  },
  'condensate receiver': {
    title: 'Condensate receivers',
    doc: 'Collects condensate ahead of a pump.',
    example: '{ kind: condensate receiver, steaming-rate: 3450 lb/h }',
    services: ['steam'],
    fields: {
      ...common,
      method: choice(
        {
          'holding time': 'flow of the pump for a time',
        },
        'Method by which the vessel is sized.',
        'holding time',
        { fallback: 'holding time' },
      ),
      duty: choice(
        { condensate: 'returns condensate', 'boiler feed': 'feeds the boiler' },
        'What the pump of the receiver does.',
        'condensate',
        { fallback: 'condensate' },
      ),
      'steaming-rate': quantity(['mass flow'], 'Steam that the boilers make at full load.', '3450 lb/h', {
        required: true,
        positive: true,
      }),
      'pump-factor': number('Flow of the pump as a multiple of the steaming rate.', '3', { least: 1 }),
      'holding-time': quantity(['time'], 'Time for which the receiver holds the flow.', '1 min', { positive: true }),
      'usable-fraction': usableFraction,
    },
    needs: [],
  },
  'break tank': {
    title: 'Break tanks',
    doc: 'Parts a drinking water system from the main and stores for its failure.',
    example: '{ kind: break tank, peak-flow: 60 gpm, holding-time: 30 min }',
    services: drinkingWater,
    fields: {
      ...common,
      method: choice(
        {
          peak: 'peak flow less refill for its length',
        },
        'Method by which the vessel is sized.',
        'peak',
        { fallback: 'peak' },
      ),
      'peak-flow': quantity(['flow'], 'Flow out of the tank at the peak.', '60 gpm', {
        required: true,
        positive: true,
      }),
      'refill-flow': quantity(['flow'], 'Flow from the main into the tank.', '20 gpm', { least: 0 }),
      'holding-time': quantity(['time'], 'Length of the peak or of the failure of the main.', '30 min', {
        required: true,
        positive: true,
      }),
      'usable-fraction': usableFraction,
    },
    needs: [],
  },
} satisfies Record<string, VesselKindDefinition>

export type VesselKind = keyof typeof vesselKinds
export type VesselFieldsOf<K extends VesselKind> = (typeof vesselKinds)[K]['fields']

export const vesselKindNames = Object.keys(vesselKinds) as readonly VesselKind[]

export const isVesselKind = (name: string): name is VesselKind => Object.hasOwn(vesselKinds, name)
