/**
 * The clinic, worked apart from the program in the units of its drawings: gallons, psi, °F. Fluid values are those of the
 * published formulations, evaluated in a worksheet of their own; pipe contents are the tabled inside diameters.
 */

const GALLON_CUBIC_INCHES = 231
/** gal held by a length in ft of pipe with an inside diameter in mm as tabled. */
const pipe = (insideMillimetres: number, feet: number): number =>
  ((Math.PI / 4) * (insideMillimetres / 25.4) ** 2 * feet * 12) / GALLON_CUBIC_INCHES
/** psi of a column of liquid: density in kg/m3, height in ft. */
const column = (density: number, feet: number): number => (density * 9.80665 * feet * 0.3048) / 6894.757293

// Standard atmosphere at 5,200 ft: 14.696 · (1 − 6.8754e-6 · 5200)^5.2559 = 14.696 · 0.96424832^5.2559.
const atmosphere = 12.136587

// IAPWS-IF97, saturated liquid, m3/kg.
const water = { at45: 1.000155305e-3, at50: 1.000346407e-3, at140: 1.017112792e-3, at180: 1.030521453e-3 }

// Propylene glycol 40 % vol lies between 39.6 (40.0 % mass) and 40.6 (41.0 % mass): 40.4 % mass.
// Density by the polynomial of Melinder (IIR 2010) at 40.4 % mass, kg/m3.
const glycol = { at20: 1045.55858, at50: 1037.96779, at165: 996.342981 }

interface Setting {
  /** Set pressure of the relief valve, psi. */
  readonly relief: number
  /** Highest pipe above the vessel, ft. */
  readonly height: number
}

/** ET-1, ASHRAE closed tank with bladder. */
export const et1With = ({ relief, height }: Setting) => {
  // 2 boilers of 22 gal; exchanger 3 gal; schedule 40 of 2 in (52.48 mm) and 1-1/4 in (35.08 mm); type L of 3/4 in
  // (19.939 mm); convectors 6 L/kW on 140 MBH = 41.03 kW, 246.2 L, 65.03 gal; reheat coils 26 gal.
  const convectors = (6 * 140 * 0.29307107) / 3.785411784
  const system = 2 * 22 + 3 + pipe(52.48, 380) + pipe(35.08, 460) + pipe(19.939, 1150) + convectors + 26
  // Water from 50 to 180 °F less three times the growth of steel, 6.5e-6 1/°F over 130 °F.
  const expansion = system * (water.at180 / water.at50 - 1 - 3 * 6.5e-6 * 130)
  // The height in water at 50 °F and 4 psi at the top.
  const fill = column(1 / water.at50, height) + 4
  const maximum = 0.9 * relief
  const room = 1 - (fill + atmosphere) / (maximum + atmosphere)
  // Code equation: 0.00041 · 180 − 0.0466 = 0.0272 of the system volume.
  return { system, expansion, fill, maximum, required: expansion / room, codeMinimum: (0.0272 * system) / room }
}

/** ET-1 as the spec has it. */
export const et1 = et1With({ relief: 50, height: 42 })

/** ET-2, the same method with glycol, connected behind the pump. */
export const et2 = (() => {
  const system = 3 + 2 * 14 + pipe(52.48, 210)
  // Liquid from 20 to 165 °F less the growth of steel over 145 °F.
  const expansion = system * (glycol.at20 / glycol.at165 - 1 - 3 * 6.5e-6 * 145)
  // 12 ft of glycol at 50 °F, 5 psi at the top, and 22 ft of pump head.
  const fill = column(glycol.at50, 12) + 5 + column(glycol.at50, 22)
  const maximum = 0.9 * 50
  const required = expansion / (1 - (fill + atmosphere) / (maximum + atmosphere))
  return { system, expansion, fill, maximum, required }
})()

/** TET-1, between the regulator and the 80 psi of the plumbing code. */
export const tet1 = (() => {
  // Two heaters of 100 gal; type L of 1-1/2 in (38.227 mm) and 3/4 in (19.939 mm). No growth is credited.
  const system = 200 + pipe(38.227, 240) + pipe(19.939, 280)
  const expansion = system * (water.at140 / water.at45 - 1)
  const fill = 60
  const maximum = Math.min(0.9 * 150, 80)
  const required = expansion / (1 - (fill + atmosphere) / (maximum + atmosphere))
  return { system, expansion, fill, maximum, required }
})()
