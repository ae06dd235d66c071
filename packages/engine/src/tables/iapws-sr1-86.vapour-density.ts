/** Density of the saturated vapour, equation (3) of the release: critical point, and coefficient with exponent (in sixths) of each term. */
export const vapourDensity = {
  criticalTemperature: 647.096,
  criticalDensity: 322,
  terms: [
    [-2.0315024, 2],
    [-2.6830294, 4],
    [-5.38626492, 8],
    [-17.2991605, 18],
    [-44.7586581, 37],
    [-63.9201063, 71],
  ],
} as const
