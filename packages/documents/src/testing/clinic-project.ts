import type { FormulaFunction } from '@coldfill/formula'
import type { ProjectResult } from '@coldfill/sizing'
import { parseQuantity, type Kind } from '@coldfill/units'
import { TraceBuilder } from './trace-builder.ts'

type Vessel = ProjectResult['vessels'][number]

const handbook = { source: 'ashrae-hvac-se', locator: 'hydronic heating and cooling, expansion tank equations' }
const boyle = { source: 'boyle', locator: 'gas at constant temperature' }
const atmosphere = {
  source: 'ashrae-fundamentals',
  locator: 'psychrometrics, standard atmosphere',
  fromMemory: true,
} as const
const sums = { source: 'geometry', locator: 'sum of the contents' }

/** SI value of a quantity as a person writes it. */
export const si = (text: string, kind: Kind): number => {
  const read = parseQuantity(text, [kind])
  if (!read.ok) throw new Error(`${text}: ${read.problem.message}`)
  return read.quantity.value
}

const spec = (path: string) => ({ from: 'spec', path }) as const

const heatingTank = (functions: Readonly<Record<string, FormulaFunction>>): Vessel => {
  const method = 'expansion-tank.ashrae.diaphragm'
  const at = (key: string) => spec(`systems.HWS.${key}`)
  const b = new TraceBuilder('ET-1', functions)
  b.section('Site')
    .input('Z', 'length', 'elevation', si('5200 ft', 'length'), spec('project.elevation'), '5200 ft')
    .step(
      'P_a',
      'absolute pressure',
      'atmospheric pressure',
      '14.696[psia] * (1 - 6.8754e-6 * (Z / 1[ft])) ^ 5.2559',
      atmosphere,
      'section.site',
    )
    .section('Contents')
    .input('N_1', 'count', 'Boilers B-1 and B-2, number', 2, at('contents.0.count'))
    .input('U_1', 'volume', 'Boilers B-1 and B-2, each', si('24 gal', 'volume'), at('contents.0.volume'), '24 gal')
    .step('V_1', 'volume', 'Boilers B-1 and B-2', 'N_1 * U_1', sums, 'section.contents')
    .input('d_2', 'diameter', 'Copper type L 2 in, inside diameter', si('1.985 in', 'diameter'), {
      from: 'table',
      citation: { source: 'astm-b88', locator: 'type L, 2 in' },
    })
    .input('L_2', 'length', 'Copper type L 2 in, length', si('640 ft', 'length'), at('contents.1.length'), '640 ft')
    .step('V_2', 'volume', 'Copper type L 2 in', 'pi / 4 * d_2 ^ 2 * L_2', sums, 'section.contents')
    .input(
      'V_3',
      'volume',
      'Air-handler coils, from the coil schedule',
      si('120 gal', 'volume'),
      at('contents.2.volume'),
      '120 gal',
    )
    .step('V_s', 'volume', 'system volume', 'V_1 + V_2 + V_3', sums, 'section.contents')
    .section('Pressures')
    .input('t_f', 'temperature', 'fill temperature', si('50 °F', 'temperature'), at('temperatures.fill'), '50 °F')
    .input('h_st', 'length', 'static height', si('42 ft', 'length'), at('pressure.static-height'), '42 ft')
    .input('p_t', 'gauge pressure', 'pressure kept at the highest point, cold', si('4 psi', 'gauge pressure'), {
      from: 'assumption',
      id: 'top-margin.hydronic',
    })
    .step('rho_f', 'density', 'density at the fill temperature', 'rho(t_f)', handbook, 'section.closed-pressures')
    .step(
      'p_st',
      'pressure difference',
      'static pressure',
      'rho_f * 9.80665[m/s2] * h_st',
      handbook,
      'section.closed-pressures',
    )
    .step('p_f', 'gauge pressure', 'fill pressure', 'p_t + p_st', handbook, 'section.closed-pressures')
    .input(
      'p_rv',
      'gauge pressure',
      'relief valve set pressure',
      si('45 psi', 'gauge pressure'),
      at('pressure.relief-valve'),
      '45 psi',
    )
    .input('m_rv', 'ratio', 'margin below the relief valve', 0.1, { from: 'assumption', id: 'relief-margin.hydronic' })
    .step('p_max', 'gauge pressure', 'maximum pressure', '(1 - m_rv) * p_rv', handbook, 'section.closed-pressures')
    .section('Vessel')
    .input(
      't_l',
      'temperature',
      'lowest water temperature',
      si('50 °F', 'temperature'),
      at('temperatures.low'),
      '50 °F',
    )
    .input(
      't_h',
      'temperature',
      'highest water temperature',
      si('180 °F', 'temperature'),
      at('temperatures.high'),
      '180 °F',
    )
    .input('alpha', 'per temperature difference', 'linear expansion of the piping', 11.7e-6, {
      from: 'assumption',
      id: 'piping-material.hydronic',
    })
    .step('v_l', 'specific volume', 'specific volume, cold', 'v_sat(t_l)', handbook, method)
    .step('v_h', 'specific volume', 'specific volume, hot', 'v_sat(t_h)', handbook, method)
    .step('e_n', 'ratio', 'net relative expansion', 'v_h / v_l - 1 - 3 * alpha * (t_h - t_l)', handbook, method)
    .step('V_e', 'volume', 'expansion volume', 'V_s * e_n', handbook, method)
    .step('P_1', 'absolute pressure', 'absolute pressure, cold', 'absolute(p_f, P_a)', boyle, method)
    .step('P_2', 'absolute pressure', 'absolute pressure, hot', 'absolute(p_max, P_a)', boyle, method)
    .step('V_t', 'volume', 'required volume', 'V_e / (1 - P_1 / P_2)', handbook, method)
    .step('p_0', 'gauge pressure', 'precharge', 'p_f', boyle, method)
  return {
    system: 'HWS',
    mark: 'ET-1',
    path: 'systems.HWS.vessels.ET-1',
    kind: 'expansion tank',
    method: 'ashrae',
    methodId: method,
    methodTitle: 'Expansion tank with diaphragm or bladder, ASHRAE',
    methodRevision: 1,
    construction: 'bladder',
    quantity: 1,
    serves: 'Heating water',
    service: 'heating water',
    fluid: 'water',
    solution: { base: 'water', massFraction: 0 },
    location: '',
    status: 'sized',
    results: {
      'required-volume': b.result('V_t', 'Required volume'),
      'system-volume': b.result('V_s', 'System volume'),
      'expansion-volume': b.result('V_e', 'Expansion volume'),
      'fill-pressure': b.result('p_f', 'Fill pressure'),
      'maximum-pressure': b.result('p_max', 'Maximum pressure'),
      precharge: b.result('p_0', 'Precharge'),
    },
    trace: b.trace,
    selected: null,
    headroom: [],
    assumptions: ['top-margin.hydronic', 'relief-margin.hydronic', 'piping-material.hydronic'],
    notes: ['Precharge with the vessel isolated and drained, before the system is filled.'],
  }
}

const thermalTank = (functions: Readonly<Record<string, FormulaFunction>>): Vessel => {
  const method = 'thermal-expansion-tank.ashrae'
  const at = (key: string) => spec(`systems.DHW.${key}`)
  const b = new TraceBuilder('TET-1', functions)
  b.section('Site')
    .input('Z', 'length', 'elevation', si('5200 ft', 'length'), spec('project.elevation'), '5200 ft')
    .step(
      'P_a',
      'absolute pressure',
      'atmospheric pressure',
      '14.696[psia] * (1 - 6.8754e-6 * (Z / 1[ft])) ^ 5.2559',
      atmosphere,
      'section.site',
    )
    .section('Contents')
    .input('V_s', 'volume', 'storage tank ST-1', si('400 gal', 'volume'), at('contents.0.volume'), '400 gal')
    .section('Pressures')
    .input('p_s', 'gauge pressure', 'supply pressure', si('95 psi', 'gauge pressure'), at('pressure.supply'), '95 psi')
    .input(
      'p_reg',
      'gauge pressure',
      'regulator setting',
      si('60 psi', 'gauge pressure'),
      at('pressure.regulator'),
      '60 psi',
    )
    .step('p_1', 'gauge pressure', 'fill pressure', 'min(p_s, p_reg)', boyle, 'section.domestic-pressures')
    .input('p_cap', 'gauge pressure', 'pressure limit of the plumbing code', si('80 psi', 'gauge pressure'), {
      from: 'assumption',
      id: 'thermal-expansion-cap',
    })
    .input(
      'p_rv',
      'gauge pressure',
      'relief valve set pressure',
      si('150 psi', 'gauge pressure'),
      at('pressure.relief-valve'),
      '150 psi',
    )
    .step('p_2', 'gauge pressure', 'maximum pressure', 'min(0.9 * p_rv, p_cap)', boyle, 'section.domestic-pressures')
    .section('Vessel')
    .input('t_c', 'temperature', 'cold water temperature', si('45 °F', 'temperature'), at('temperatures.cold'), '45 °F')
    .input(
      't_h',
      'temperature',
      'storage temperature',
      si('140 °F', 'temperature'),
      at('temperatures.storage'),
      '140 °F',
    )
    .step('v_c', 'specific volume', 'specific volume, cold', 'v_sat(t_c)', handbook, method)
    .step('v_h', 'specific volume', 'specific volume, hot', 'v_sat(t_h)', handbook, method)
    .step('V_e', 'volume', 'expansion volume', 'V_s * (v_h / v_c - 1)', handbook, method)
    .step('P_1', 'absolute pressure', 'absolute pressure, cold', 'absolute(p_1, P_a)', boyle, method)
    .step('P_2', 'absolute pressure', 'absolute pressure, hot', 'absolute(p_2, P_a)', boyle, method)
    .step('V_t', 'volume', 'required volume', 'V_e / (1 - P_1 / P_2)', handbook, method)
    .step('p_0', 'gauge pressure', 'precharge', 'p_1', boyle, method)
  return {
    system: 'DHW',
    mark: 'TET-1',
    path: 'systems.DHW.vessels.TET-1',
    kind: 'thermal expansion tank',
    method: 'ashrae',
    methodId: method,
    methodTitle: 'Thermal expansion tank',
    methodRevision: 1,
    construction: 'diaphragm',
    quantity: 1,
    serves: 'Domestic hot water',
    service: 'domestic hot water',
    fluid: 'water',
    solution: { base: 'water', massFraction: 0 },
    location: '',
    status: 'sized',
    results: {
      'required-volume': b.result('V_t', 'Required volume'),
      'system-volume': b.result('V_s', 'Heated volume'),
      'expansion-volume': b.result('V_e', 'Expansion volume'),
      'fill-pressure': b.result('p_1', 'Fill pressure'),
      'maximum-pressure': b.result('p_2', 'Maximum pressure'),
      precharge: b.result('p_0', 'Precharge'),
    },
    trace: b.trace,
    selected: {
      maker: 'Invented Vessel Works',
      model: 'T 50',
      volume: si('50 gal', 'volume'),
      maxPressure: si('150 psi', 'gauge pressure'),
      maxTemperature: si('200 °F', 'temperature'),
      stamped: true,
      quantity: 1,
    },
    headroom: [],
    assumptions: ['relief-margin.hydronic', 'thermal-expansion-cap'],
    notes: [
      'Precharge with the vessel isolated and drained, before the system is filled.',
      'Install on the cold supply, between check valve and heater.',
    ],
  }
}

const without = (vessel: Vessel, mark: string, status: 'infeasible' | 'blocked', reason: string): Vessel => ({
  ...vessel,
  mark,
  path: vessel.path.replace(vessel.mark, mark),
  status,
  reason,
  results: {},
  trace: [],
  selected: null,
  notes: [],
})

/**
 * A clinic with one heating expansion tank, one thermal expansion tank, an infeasible and a blocked vessel, made by hand.
 * `functions` are the fluid functions of water.
 */
export const clinicProject = (functions: Readonly<Record<string, FormulaFunction>>): ProjectResult => {
  const heating = heatingTank(functions)
  const thermal = thermalTank(functions)
  const nowhere = { start: { line: 0, character: 0 }, end: { line: 0, character: 0 } }
  return {
    engine: '0.1.0',
    spec: 1,
    readable: true,
    project: {
      number: 'FC-241',
      title: 'Fernhollow Community Clinic',
      client: 'Fernhollow Health Trust',
      location: 'Tarn Valley',
      units: 'US',
      elevation: si('5200 ft', 'length'),
      atmosphere: heating.trace[0]?.entries[1]?.value ?? 0,
      codes: { plumbing: 'UPC 2024', mechanical: 'IMC 2021' },
      specSections: { 'expansion tank': '23 21 16', 'thermal expansion tank': '22 11 19' },
    },
    systems: [
      {
        id: 'HWS',
        title: 'Heating water',
        path: 'systems.HWS',
        service: 'heating water',
        fluid: 'water',
        pressures: [],
        relief: { set: si('45 psi', 'gauge pressure'), height: 0 },
      },
      {
        id: 'DHW',
        title: 'Domestic hot water',
        path: 'systems.DHW',
        service: 'domestic hot water',
        fluid: 'water',
        pressures: [],
        relief: { set: si('150 psi', 'gauge pressure'), height: 0 },
      },
    ],
    vessels: [
      heating,
      without(
        heating,
        'ET-2',
        'infeasible',
        'The fill pressure is not below the highest pressure allowed, so no vessel is large enough.',
      ),
      thermal,
      without(thermal, 'TET-2', 'blocked', 'The storage temperature is missing.'),
    ],
    assumptions: [
      {
        id: 'top-margin.hydronic',
        number: 'A1',
        name: 'Pressure kept at the top of the system',
        value: '4 psi',
        defaultValue: '4 psi',
        overridden: false,
        source: handbook,
        because: 'Keeps air out of the highest point; a larger margin makes the vessel larger.',
        path: 'systems.HWS.pressure.top-margin',
        usedBy: ['HWS/ET-1', 'HWS/ET-2'],
      },
      {
        id: 'relief-margin.hydronic',
        number: 'A2',
        name: 'Margin below the relief valve',
        value: '10 %',
        defaultValue: '10 %',
        overridden: true,
        source: { source: 'common-practice', locator: 'margin below the relief valve' },
        because: 'A valve weeps near its set pressure.',
        reason: "Owner's standard, section 5.2",
        path: 'assumptions.relief-margin.hydronic',
        usedBy: ['HWS/ET-1', 'DHW/TET-1'],
      },
      {
        id: 'piping-material.hydronic',
        number: 'A3',
        name: 'Material of most of the piping',
        value: 'steel',
        defaultValue: 'steel',
        overridden: false,
        source: handbook,
        because: 'Steel grows less than copper, so the vessel comes out larger, never smaller.',
        path: 'systems.HWS.vessels.ET-1.material',
        usedBy: ['HWS/ET-1'],
      },
      {
        id: 'thermal-expansion-cap',
        number: 'A4',
        name: 'Pressure limit of the plumbing code',
        value: '80 psi',
        defaultValue: '80 psi',
        overridden: false,
        source: { source: 'upc', locator: '608.2', fromMemory: true },
        because: 'Fixtures are not to see more, thermal expansion included.',
        path: 'assumptions.thermal-expansion-cap',
        usedBy: ['DHW/TET-1'],
      },
    ],
    findings: [
      {
        code: 'CF-E020',
        severity: 'error',
        message: 'The fill pressure is not below the highest pressure allowed, so no vessel is large enough.',
        hint: 'Raise the relief setting or lower the static height.',
        path: 'systems.HWS.vessels.ET-2',
        range: nowhere,
        related: [],
        fixes: [],
      },
      {
        code: 'CF-E031',
        severity: 'warning',
        message: 'The supply pressure is above 80 psi at the fixtures.',
        hint: 'Set the regulator to 80 psi or less.',
        path: 'systems.DHW.pressure.supply',
        range: nowhere,
        related: [],
        fixes: [],
        accepted: 'The regulator stands upstream of every fixture.',
      },
    ],
    sources: {
      'ashrae-hvac-se': { title: 'ASHRAE Handbook, HVAC Systems and Equipment', edition: '2020', publisher: '' },
      'ashrae-fundamentals': { title: 'ASHRAE Handbook, Fundamentals', edition: '2021', publisher: '' },
      'astm-b88': { title: 'ASTM B88, Seamless copper water tube', edition: '2020', publisher: '' },
      boyle: { title: "Boyle's law", edition: '', publisher: '' },
      geometry: { title: 'Geometry', edition: '', publisher: '' },
      'common-practice': { title: 'Common practice, no source', edition: '', publisher: '' },
      upc: { title: 'Uniform Plumbing Code', edition: '2024', publisher: '' },
    },
  }
}
