import { choice, quantity, text, yesNo } from './field.ts'

/** A pressure is a gauge reading unless it says that it is absolute. */
export const pressureReading = ['gauge pressure', 'absolute pressure'] as const

export const serviceField = choice(
  {
    'heating water': 'closed loop that heats',
    'chilled water': 'closed loop that cools',
    'dual temperature water': 'one loop that heats in winter and cools in summer',
    'condenser water': 'loop that rejects heat from condensers',
    'ground loop': 'closed loop through boreholes or trenches',
    'snow melting': 'closed loop under pavement',
    'solar thermal': 'closed loop through solar collectors',
    'domestic hot water': 'heated drinking water',
    'domestic cold water': 'drinking water under pressure',
    steam: 'steam and its condensate',
  },
  'What the system carries and does. It decides which keys and vessels belong in it.',
  'heating water',
  { required: true },
)

export type Service = keyof typeof serviceField.choices

/** Closed loops of heating and cooling, which are filled once and expand. */
export const hydronicServices = [
  'heating water',
  'chilled water',
  'dual temperature water',
  'condenser water',
  'ground loop',
  'snow melting',
  'solar thermal',
] as const satisfies readonly Service[]

export const systemFields = {
  title: text('Name of the system on drawings and schedules.', 'Heating water', { fallback: 'the id of the system' }),
  service: serviceField,
}

export const temperatureFields = {
  fill: quantity(['temperature'], 'Temperature of the water when the system is filled.', '50 °F', {
    fallback: 'the same as low',
  }),
  low: quantity(['temperature'], 'Coldest that the water gets, shutdown included.', '50 °F'),
  high: quantity(['temperature'], 'Hottest that the water gets, shutdown included.', '180 °F'),
  average: quantity(['temperature'], 'Average temperature in operation, which the code equation asks for.', '170 °F', {
    fallback: 'high, and then an assumption',
  }),
  cold: quantity(['temperature'], 'Coldest water that enters the heater.', '45 °F'),
  storage: quantity(['temperature'], 'Temperature at which hot water is stored.', '140 °F'),
}

export const pressureFields = {
  'static-height': quantity(
    ['length'],
    'Height of the highest point of the system above the vessel connection.',
    '42 ft',
    {
      least: 0,
    },
  ),
  'top-margin': quantity(
    ['gauge pressure'],
    'Positive pressure kept at the highest point when the system is cold.',
    '4 psi',
    {
      fallback: '4 psi, or 0.3 bar under an EN, DIN or BS method, and then an assumption',
      least: 0,
    },
  ),
  'relief-valve': quantity(pressureReading, 'Set pressure of the relief valve.', '30 psi', { positive: true }),
  'relief-height': quantity(['length'], 'Height of the relief valve above (+) or below (-) the vessel.', '0 ft', {
    fallback: 'level with the vessel',
  }),
  'relief-margin': quantity(
    ['ratio', 'pressure difference'],
    'How far below the set pressure of the relief valve the system stays, as a part of the set pressure or as a pressure.',
    '10 %',
    { fallback: '10 % of the set pressure, and then an assumption', least: 0 },
  ),
  'pump-head': quantity(
    ['length', 'pressure difference'],
    'Head of the pump at design flow. It is added to the fill pressure where the vessel connects at the pump discharge.',
    '45 ft',
    { least: 0 },
  ),
  'vessel-connection': choice(
    {
      'pump suction': 'the pump discharges away from the vessel',
      'pump discharge': 'the pump discharges towards the vessel, so its head is added to the fill pressure',
    },
    'Side of the pump on which the vessel connects.',
    'pump suction',
    { fallback: 'pump suction' },
  ),
  fill: quantity(pressureReading, 'Cold fill pressure at the vessel, given outright instead of worked out.', '22 psi', {
    least: 0,
  }),
  maximum: quantity(
    pressureReading,
    'Highest pressure allowed at the vessel, given outright instead of worked out.',
    '27 psi',
    {
      positive: true,
    },
  ),
  supply: quantity(pressureReading, 'Pressure from the street main or the booster.', '95 psi', { positive: true }),
  regulator: quantity(
    pressureReading,
    'Reduced pressure at the vessel, behind the pressure regulator. Left out where there is none.',
    '60 psi',
    {
      positive: true,
    },
  ),
  'backflow-preventer': yesNo('Whether a backflow preventer or a check valve closes the system.', 'yes'),
  'cut-in': quantity(pressureReading, 'Pressure at which the pump starts.', '40 psi', { positive: true }),
  'cut-out': quantity(pressureReading, 'Pressure at which the pump stops.', '60 psi', { positive: true }),
}

export type TemperatureKey = keyof typeof temperatureFields
export type PressureKey = keyof typeof pressureFields

interface ServiceKeys {
  readonly temperatures: readonly TemperatureKey[]
  readonly pressure: readonly PressureKey[]
}

const hydronic: ServiceKeys = {
  temperatures: ['fill', 'low', 'high', 'average'],
  pressure: [
    'static-height',
    'top-margin',
    'relief-valve',
    'relief-height',
    'relief-margin',
    'pump-head',
    'vessel-connection',
    'fill',
    'maximum',
  ],
}

/** The keys of `temperatures:` and `pressure:` that mean something in a system of each service. */
export const serviceKeys: Readonly<Record<Service, ServiceKeys>> = {
  'heating water': hydronic,
  'chilled water': hydronic,
  'dual temperature water': hydronic,
  'condenser water': hydronic,
  'ground loop': hydronic,
  'snow melting': hydronic,
  'solar thermal': hydronic,
  'domestic hot water': {
    temperatures: ['cold', 'storage'],
    pressure: [
      'supply',
      'regulator',
      'backflow-preventer',
      'relief-valve',
      'relief-height',
      'relief-margin',
      'maximum',
    ],
  },
  'domestic cold water': {
    temperatures: ['cold'],
    pressure: ['supply', 'regulator', 'backflow-preventer', 'relief-valve', 'maximum', 'cut-in', 'cut-out'],
  },
  steam: { temperatures: [], pressure: ['relief-valve', 'maximum'] },
}

export const isService = (name: string): name is Service => Object.hasOwn(serviceField.choices, name)
