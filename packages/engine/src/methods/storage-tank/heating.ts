import { cite, type Citation } from '../../citation.ts'
import { keyed, step, type MethodCheck, type MethodInput, type MethodStep } from '../../method.ts'
import { ashraeServiceWater } from '../../sources/ashrae-service-water.ts'
import { heatBalance } from '../../sources/heat-balance.ts'

const balance = cite(heatBalance, 'heat taken up by the recovered water')

/** What every storage tank shares: the temperatures, the heat that the recovery takes, and the time to heat up the tank. */
export const heatingInputs: Readonly<Record<string, MethodInput>> = {
  t_c: keyed('temperature', 'cold water temperature', 'temperatures', 'cold', 'storage.cold-water'),
  t_s: keyed('temperature', 'storage temperature', 'temperatures', 'storage', 'storage.temperature'),
}

/** To come after the steps that give the recovery `q_r` and the tank `V_t`. */
export const heatingSteps: Readonly<Record<string, MethodStep>> = {
  t_m: step('temperature', 'mean temperature', 't_c + (t_s - t_c) / 2', balance),
  rho_m: step('density', 'density at the mean temperature', 'rho(t_m)', balance),
  c_m: step('specific heat', 'specific heat at the mean temperature', 'c_p(t_m)', balance),
  Q_h: step('power', 'heat input to the water', 'q_r * rho_m * c_m * (t_s - t_c)', balance),
  tau_h: step(
    'time',
    'time to heat up the whole tank',
    'V_t / q_r',
    cite(heatBalance, 'whole content at the rate of the recovery'),
  ),
}

export const heatingChecks: readonly MethodCheck[] = [
  {
    condition: 't_s > t_c',
    code: 'CF-E010',
    message: 'The storage temperature is not above the cold water temperature, so nothing is heated.',
    hint: 'Give `temperatures.cold` and `temperatures.storage`.',
  },
]

export const storageResults = {
  'required-volume': 'V_t',
  'storage-volume': 'V_t',
  recovery: 'q_r',
  'heat-input': 'Q_h',
  'heat-up-time': 'tau_h',
} as const

export const heatingBasis =
  'The heat input is what the water takes up at the rate of the recovery; heat lost by piping and tank, and the efficiency of the heater, come on top.'

/** The demand tables hold for water at 140 °F; stored cooler, more of it is drawn. */
export const atTableTemperature = (source: Citation = cite(ashraeServiceWater, 'demand tables at 140 °F')) => ({
  condition: 't_s >= 139.9[°F]',
  source,
  message:
    'the demand table holds for water at 140 °F (60 °C); stored cooler, more of it is drawn than is counted here.',
})
