/** Region 4 of IF97, the saturation line, table 34 of the release: n1 to n10, for pressures in MPa and temperatures in K. */
export const if97Region4 = [
  1167.0521452767, -724213.16703206, -17.073846940092, 12020.82470247, -3232555.0322333, 14.91510861353,
  -4823.2657361591, 405113.40542057, -0.23855557567849, 650.17534844798,
] as const
