/** A spec of about a thousand lines: systems of an ordinary building, again and again, with remarks as people write them. */
export const longSpec = (lines: number): string => {
  const text = [
    'coldfill: 1',
    'project:',
    '  number: FC-241',
    '  title: Long building',
    '  client: Fernhollow Health Trust',
    '  elevation: 5200 ft',
    '  units: US',
    'systems:',
  ]
  for (let n = 1; text.length < lines; n += 1)
    text.push(
      `  # Wing ${n} has a loop of its own, which its boilers heat.`,
      `  HWS-${n}:`,
      `    title: Heating water of wing ${n}`,
      '    service: heating water',
      '    temperatures:',
      '      low: 50 °F # coldest the water gets, shutdown included',
      '      high: 180 °F # hottest the water gets',
      '    pressure:',
      '      static-height: 42 ft # to the highest pipe in the penthouse',
      '      relief-valve: 50 psi',
      '      vessel-connection: pump suction',
      '    contents:',
      `      - equipment: Boilers B-${n}`,
      '        volume: 24 gal',
      '        count: 2',
      '        material: steel',
      '      - pipe: steel schedule 40',
      '        size: 2 in',
      '        length: 640 ft',
      '      - estimate: convectors',
      '        output: 400 MBH',
      '    vessels:',
      `      ET-${n}:`,
      '        kind: expansion tank',
      '        construction: bladder',
      '        method: ashrae',
      `        location: Mechanical room ${n}`,
      '',
    )
  return `${text.join('\n')}\n`
}
