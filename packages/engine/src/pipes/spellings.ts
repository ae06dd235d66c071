const VULGAR: Readonly<Record<string, string>> = { '1/4': '¼', '3/8': '⅜', '1/2': '½', '5/8': '⅝', '3/4': '¾' }

/** The ways a nominal size in inches is written beside `1-1/2 in`: `1 1/2 in`, `1.5 in`, `1½"`, `1-1/2`, and its DN. */
export const nominalSpellings = (size: string, dn: number | null): string[] => {
  const [, whole = '', fraction = ''] = /^(?:(\d+)-)?(\d+\/\d+)$/u.exec(size) ?? [undefined, size]
  const [over = 0, under = 1] = fraction === '' ? [] : fraction.split('/').map(Number)
  const numbers = [size]
  if (fraction !== '') {
    if (whole !== '') numbers.push(`${whole} ${fraction}`)
    numbers.push(String(Number(whole) + over / under))
    const vulgar = VULGAR[fraction]
    if (vulgar !== undefined) numbers.push(`${whole}${vulgar}`)
  }
  const inches = numbers.flatMap((number) => [
    `${number} in`,
    `${number}in`,
    `${number} inch`,
    `${number}"`,
    `${number}″`,
    number,
  ])
  const metric = dn === null ? [] : [`DN ${dn}`, `DN${dn}`]
  return [...inches, ...numbers.map((number) => `NPS ${number}`), ...metric].filter(
    (spelling) => spelling !== `${size} in`,
  )
}

/** The ways an outside diameter and a wall in mm are written beside `28 x 1 mm`: `28x1`, `28 × 1.0 mm`, `28 mm x 1 mm`. */
export const outsideByWallSpellings = (outside: number, wall: number): string[] => {
  const walls = [...new Set([String(wall), wall.toFixed(1)])]
  return walls
    .flatMap((each) => [
      `${outside} x ${each} mm`,
      `${outside} x ${each}`,
      `${outside}x${each} mm`,
      `${outside}x${each}`,
      `${outside} × ${each} mm`,
      `${outside} × ${each}`,
      `${outside}×${each}`,
      `${outside} mm x ${each} mm`,
    ])
    .filter((spelling) => spelling !== `${outside} x ${wall} mm`)
}

/** Plastic pipe of a series has one wall for each outside diameter, which is then the nominal size: `32 mm`, `DN/OD 32`, `DN 32`. */
export const outsideSpellings = (outside: number): string[] => [
  `${outside} mm`,
  `${outside}mm`,
  `DN/OD ${outside}`,
  `DN ${outside}`,
  `DN${outside}`,
  `OD ${outside}`,
  `d ${outside}`,
  `d${outside}`,
]

/** Case, the kind of cross and doubled or missing spaces do not tell sizes apart. */
export const plainSize = (text: string): string =>
  text
    .trim()
    .toLowerCase()
    .replaceAll('×', 'x')
    .replaceAll('″', '"')
    .replace(/(\d)\s+(?=\d)/gu, '$1-')
    .replace(/\s+/gu, '')
    .replace(/(?:inches|inch)$/u, 'in')
