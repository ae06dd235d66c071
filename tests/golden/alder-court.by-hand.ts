/**
 * The apartment house, worked apart from the program in L, bar and °C. The water density at 10 °C is that of IAPWS-IF97,
 * evaluated in a worksheet of its own; pipe contents are the tabled inside diameters.
 */

/** L held by a length in m of pipe with an inside diameter in mm as tabled. */
const pipe = (insideMillimetres: number, metres: number): number =>
  ((Math.PI / 4) * insideMillimetres ** 2 * metres) / 1000

/** Saturated liquid at 10 °C, kg/m3: 1 / 1.000346407e-3. */
const WATER_AT_10 = 999.6537

/** EV-1, EN 12828, gauge pressures made absolute with 1 bar. */
export const ev1 = (() => {
  // Boiler 24 L; radiators 11 L/kW on 58 kW; EN 10255 medium DN 40 (41.9 mm) and DN 25 (27.3 mm); EN 1057 18 x 1 (16 mm).
  const system = 24 + 11 * 58 + pipe(41.9, 44) + pipe(27.3, 96) + pipe(16, 310)
  // (0.31 + 3.9e-4 · 75²) % = 2.50375 %
  const expansion = 0.0250375 * system
  const reserve = Math.max(0.005 * system, 3)
  // Static height 11.5 m and 0.3 bar.
  const precharge = (WATER_AT_10 * 9.80665 * 11.5) / 1e5 + 0.3
  const maximum = 3 - 0.5
  const required = ((expansion + reserve) * (maximum + 1)) / (maximum - precharge)
  return { system, expansion, reserve, precharge, maximum, required }
})()

/** PT-1, a quarter of a cycle at half flow: 15 min · 1.2 L/s / 15 starts. */
export const pt1 = (() => {
  const drawdown = (15 * 60 * 1.2) / 15
  // Standard atmosphere at 8 m = 26.2467 ft: 14.696 · (1 − 6.8754e-6 · 26.2467)^5.2559 = 14.68207 psi = 1.012293 bar.
  const atmosphere = 1.012293
  // 2 psi below cut-in.
  const precharge = 4 - 2 * 0.06894757
  const share = (precharge + atmosphere) / (4 + atmosphere) - (precharge + atmosphere) / (5.5 + atmosphere)
  return { drawdown, precharge, required: drawdown / share }
})()

/** EV-2, DIN 4807-5 as the method states it: 1.67 % from 10 to 60 °C, charge 0.2 bar below the regulator, 0.8 of the relief valve. */
export const ev2 = (() => {
  // Store 500 L; EN 1057 28 x 1.2 (25.6 mm) and 15 x 1 (13 mm).
  const system = 500 + pipe(25.6, 62) + pipe(13, 58)
  const expansion = 0.0167 * system
  const incoming = Math.min(5.5, 4)
  const maximum = 0.8 * 10
  const precharge = incoming - 0.2
  const required = (expansion * (maximum + 0.5) * (incoming + 1.2)) / ((precharge + 1) * (maximum - incoming - 0.7))
  return { system, expansion, precharge, maximum, required }
})()
