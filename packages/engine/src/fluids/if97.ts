import { if97Region1, if97Region1Reducing as reducing } from '../tables/iapws-r7-97.region-1.ts'
import { if97Region4 } from '../tables/iapws-r7-97.region-4.ts'

const { gasConstant: R } = reducing

/** Least temperature of regions 1 and 4, the greatest of region 1, and the critical temperature, in K. */
export const if97Least = 273.15
export const if97Region1Most = 623.15
const CRITICAL = 647.096

/** Partial derivative of the dimensionless Gibbs energy of region 1: `p` times by pi, `t` times by tau. */
const gibbs = (T: number, P: number, p: number, t: number): number => {
  const x = reducing.pi - P / reducing.pressure
  const y = reducing.temperature / T - reducing.tau
  let sum = 0
  for (const [i, j, n] of if97Region1) {
    let term = n
    for (let k = 0; k < p; k++) term *= -(i - k)
    for (let k = 0; k < t; k++) term *= j - k
    if (term !== 0) sum += term * x ** (i - p) * y ** (j - t)
  }
  return sum
}

const tau = (T: number): number => reducing.temperature / T

/** Specific volume of liquid water in m3/kg at T in K and P in Pa absolute, region 1. */
export const volume = (T: number, P: number): number => (R * T * gibbs(T, P, 1, 0)) / reducing.pressure

/** Its partial derivatives by temperature and by pressure. */
export const volumePartials = (T: number, P: number): { byTemperature: number; byPressure: number } => ({
  byTemperature: (R / reducing.pressure) * (gibbs(T, P, 1, 0) - tau(T) * gibbs(T, P, 1, 1)),
  byPressure: (R * T * gibbs(T, P, 2, 0)) / reducing.pressure ** 2,
})

/** Isobaric specific heat of liquid water in J/(kg K), region 1. */
export const specificHeat = (T: number, P: number): number => -R * tau(T) ** 2 * gibbs(T, P, 0, 2)

export const specificHeatPartials = (T: number, P: number): { byTemperature: number; byPressure: number } => ({
  byTemperature: ((R * tau(T) ** 2) / T) * (2 * gibbs(T, P, 0, 2) + tau(T) * gibbs(T, P, 0, 3)),
  byPressure: (-R * tau(T) ** 2 * gibbs(T, P, 1, 2)) / reducing.pressure,
})

/** Specific enthalpy of liquid water in J/kg, region 1. Zero internal energy is that of the liquid at the triple point. */
export const enthalpy = (T: number, P: number): number => R * T * tau(T) * gibbs(T, P, 0, 1)

const MEGA = 1e6
const [n1, n2, n3, n4, n5, n6, n7, n8, n9, n10] = if97Region4

/** Saturation pressure of water in Pa absolute at T in K; NaN outside 273.15 K to the critical point, 647.096 K. */
export const saturationPressure = (T: number): number => {
  if (!(T >= if97Least - 1e-9 && T <= CRITICAL)) return Number.NaN
  const theta = T + n9 / (T - n10)
  const a = theta ** 2 + n1 * theta + n2
  const b = n3 * theta ** 2 + n4 * theta + n5
  const c = n6 * theta ** 2 + n7 * theta + n8
  return MEGA * ((2 * c) / (-b + Math.sqrt(b ** 2 - 4 * a * c))) ** 4
}

/** Slope of the saturation pressure in Pa/K. */
export const saturationSlope = (T: number): number => {
  // The saturation line is a quadratic in beta = (p/1 MPa)^(1/4) and theta; its total differential gives the slope.
  const beta = (saturationPressure(T) / MEGA) ** 0.25
  const theta = T + n9 / (T - n10)
  const byTheta = beta ** 2 * (2 * theta + n1) + beta * (2 * n3 * theta + n4) + 2 * n6 * theta + n7
  const byBeta = 2 * beta * (theta ** 2 + n1 * theta + n2) + n3 * theta ** 2 + n4 * theta + n5
  return MEGA * 4 * beta ** 3 * (-byTheta / byBeta) * (1 - n9 / (T - n10) ** 2)
}

/** Second derivative of the saturation pressure in Pa/K2. */
export const saturationCurvature = (T: number): number => {
  const beta = (saturationPressure(T) / MEGA) ** 0.25
  const theta = T + n9 / (T - n10)
  const thetaSlope = 1 - n9 / (T - n10) ** 2
  const thetaCurvature = (2 * n9) / (T - n10) ** 3
  const byTheta = beta ** 2 * (2 * theta + n1) + beta * (2 * n3 * theta + n4) + 2 * n6 * theta + n7
  const byBeta = 2 * beta * (theta ** 2 + n1 * theta + n2) + n3 * theta ** 2 + n4 * theta + n5
  const byBetaTwice = 2 * (theta ** 2 + n1 * theta + n2)
  const byThetaTwice = 2 * beta ** 2 + 2 * n3 * beta + 2 * n6
  const byBoth = 2 * beta * (2 * theta + n1) + 2 * n3 * theta + n4
  const slope = -byTheta / byBeta
  const curvature = -(byThetaTwice + 2 * byBoth * slope + byBetaTwice * slope ** 2) / byBeta
  const betaSlope = slope * thetaSlope
  const betaCurvature = curvature * thetaSlope ** 2 + slope * thetaCurvature
  return MEGA * (12 * beta ** 2 * betaSlope ** 2 + 4 * beta ** 3 * betaCurvature)
}

/** Saturation temperature of water in K at P in Pa absolute; NaN outside 611.213 Pa to 22.064 MPa. */
export const saturationTemperature = (P: number): number => {
  if (!(P >= 611.2 && P <= 22.064e6)) return Number.NaN
  const beta = (P / MEGA) ** 0.25
  const e = beta ** 2 + n3 * beta + n6
  const f = n1 * beta ** 2 + n4 * beta + n7
  const g = n2 * beta ** 2 + n5 * beta + n8
  const d = (2 * g) / (-f - Math.sqrt(f ** 2 - 4 * e * g))
  return (n10 + d - Math.sqrt((n10 + d) ** 2 - 4 * (n9 + n10 * d))) / 2
}
