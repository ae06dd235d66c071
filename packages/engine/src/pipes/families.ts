import { cite, citeFromMemory, type Citation, type Source } from '../citation.ts'
import { asmeB36Part10 } from '../sources/asme-b36-10m.ts'
import { asmeB36Part19 } from '../sources/asme-b36-19m.ts'
import { astmB88 } from '../sources/astm-b88.ts'
import { astmD2846 } from '../sources/astm-d2846.ts'
import { astmF2623 } from '../sources/astm-f2623.ts'
import { astmF441 } from '../sources/astm-f441.ts'
import { astmF876 } from '../sources/astm-f876.ts'
import { en10255 } from '../sources/en-10255.ts'
import { en1057 } from '../sources/en-1057.ts'
import { iso15874Part2 } from '../sources/iso-15874-2.ts'
import { iso4427Part2 } from '../sources/iso-4427-2.ts'
import * as b36Part10 from '../tables/asme-b36-10m.dimensions.ts'
import * as b36Part19 from '../tables/asme-b36-19m.dimensions.ts'
import * as b88 from '../tables/astm-b88.dimensions.ts'
import { cpvcSdr11 } from '../tables/astm-d2846.dimensions.ts'
import { peRtSdr9 } from '../tables/astm-f2623.dimensions.ts'
import { cpvcSchedule80 } from '../tables/astm-f441.dimensions.ts'
import { pexSdr9 } from '../tables/astm-f876.dimensions.ts'
import { steelMedium } from '../tables/en-10255.dimensions.ts'
import { copperEn1057 } from '../tables/en-1057.dimensions.ts'
import { ppRSdr11, ppRSdr7 } from '../tables/iso-15874-2.dimensions.ts'
import { hdpeSdr11 } from '../tables/iso-4427-2.dimensions.ts'
import type { InchRow, MetricNominalRow, MetricRow, RowMark } from './dimensions.ts'
import { nominalSpellings, outsideByWallSpellings, outsideSpellings } from './spellings.ts'

/** One size of a pipe. Lengths in m. */
export interface PipeRow {
  /** As a person writes it: `2 in`, `1-1/2 in`, `28 x 1 mm`. */
  readonly size: string
  /** Other accepted ways of writing it, `DN 50` and `2"` among them. */
  readonly spellings: readonly string[]
  readonly outsideDiameter: number
  readonly wall: number
  /** Outside diameter less twice the wall: contents are computed from it, never copied from a table of contents. */
  readonly insideDiameter: number
  readonly provenance: 'transcribed' | RowMark
  readonly citation: Citation
}

export interface PipeFamily {
  /** Name in a spec, as in `copper type L`. */
  readonly name: string
  /** Standard and series: `ASTM B88, type L`. */
  readonly standard: string
  /** What its growth counts as. Stainless steel grows more than steel and counts as steel; plastics get no credit. */
  readonly material: 'steel' | 'copper' | 'none'
  /** Which wall the inside diameter is computed from. */
  readonly wallBasis: 'nominal wall' | 'average wall' | 'least wall'
  readonly rows: readonly PipeRow[]
}

const INCH = 0.0254
const MILLIMETRE = 0.001

type Head = Omit<PipeFamily, 'rows'> & { readonly source: Source }

const row = (
  head: Head,
  size: string,
  spellings: string[],
  outside: number,
  wall: number,
  unit: number,
  mark?: RowMark,
): PipeRow => ({
  size,
  spellings,
  outsideDiameter: outside * unit,
  wall: wall * unit,
  insideDiameter: (outside - 2 * wall) * unit,
  provenance: mark ?? 'transcribed',
  citation: (mark === undefined ? cite : citeFromMemory)(
    head.source,
    `dimensions, ${head.standard.replace(/^[^,]*, /u, '')}, ${size}`,
  ),
})

const family = ({ name, standard, material, wallBasis }: Head, rows: PipeRow[]): PipeFamily => ({
  name,
  standard,
  material,
  wallBasis,
  rows,
})

const inchFamily = (head: Head, rows: readonly InchRow[]): PipeFamily =>
  family(
    head,
    rows.map(([size, dn, outside, wall, mark]) =>
      row(head, `${size} in`, nominalSpellings(size, dn), outside, wall, INCH, mark),
    ),
  )

const nominalFamily = (head: Head, rows: readonly MetricNominalRow[]): PipeFamily =>
  family(
    head,
    rows.map(([size, dn, outside, wall, mark]) =>
      row(head, `${size} in`, nominalSpellings(size, dn), outside, wall, MILLIMETRE, mark),
    ),
  )

/** DN stands first where a European standard names its sizes by it. */
const dnFamily = (head: Head, rows: readonly MetricNominalRow[]): PipeFamily =>
  family(
    head,
    rows.map(([size, dn, outside, wall, mark]) => {
      const spellings = [`${size} in`, ...nominalSpellings(size, dn).filter((spelling) => spelling !== `DN ${dn}`)]
      return row(head, `DN ${dn}`, spellings, outside, wall, MILLIMETRE, mark)
    }),
  )

const wallFamily = (head: Head, rows: readonly MetricRow[], oneWallPerDiameter: boolean): PipeFamily =>
  family(
    head,
    rows.map(([outside, wall, mark]) => {
      const spellings = [
        ...outsideByWallSpellings(outside, wall),
        ...(oneWallPerDiameter ? outsideSpellings(outside) : []),
      ]
      return row(head, `${outside} x ${wall} mm`, spellings, outside, wall, MILLIMETRE, mark)
    }),
  )

const copper = (type: 'K' | 'L' | 'M', rows: readonly InchRow[]): PipeFamily =>
  inchFamily(
    {
      name: `copper type ${type}`,
      standard: `ASTM B88, type ${type}`,
      material: 'copper',
      wallBasis: 'nominal wall',
      source: astmB88,
    },
    rows,
  )

const steel = (schedule: string, rows: readonly MetricNominalRow[]): PipeFamily =>
  nominalFamily(
    {
      name: `steel schedule ${schedule}`,
      standard: `ASME B36.10M, ${/^\d/u.test(schedule) ? `schedule ${schedule}` : schedule}`,
      material: 'steel',
      wallBasis: 'nominal wall',
      source: asmeB36Part10,
    },
    rows,
  )

const stainless = (schedule: string, rows: readonly MetricNominalRow[]): PipeFamily =>
  nominalFamily(
    {
      name: `stainless schedule ${schedule}`,
      standard: `ASME B36.19M, schedule ${schedule}`,
      material: 'steel',
      wallBasis: 'nominal wall',
      source: asmeB36Part19,
    },
    rows,
  )

const families: readonly PipeFamily[] = [
  copper('K', b88.copperTypeK),
  copper('L', b88.copperTypeL),
  copper('M', b88.copperTypeM),
  wallFamily(
    {
      name: 'copper EN 1057',
      standard: 'EN 1057, outside diameter by wall',
      material: 'copper',
      wallBasis: 'nominal wall',
      source: en1057,
    },
    copperEn1057,
    false,
  ),
  steel('10', b36Part10.steelSchedule10),
  steel('40', b36Part10.steelSchedule40),
  steel('80', b36Part10.steelSchedule80),
  steel('STD', b36Part10.steelStandard),
  steel('XS', b36Part10.steelExtraStrong),
  dnFamily(
    {
      name: 'steel EN 10255 medium',
      standard: 'EN 10255, medium series',
      material: 'steel',
      wallBasis: 'nominal wall',
      source: en10255,
    },
    steelMedium,
  ),
  stainless('10S', b36Part19.stainlessSchedule10S),
  stainless('40S', b36Part19.stainlessSchedule40S),
  inchFamily(
    { name: 'PEX SDR 9', standard: 'ASTM F876, SDR 9', material: 'none', wallBasis: 'average wall', source: astmF876 },
    pexSdr9,
  ),
  inchFamily(
    {
      name: 'PE-RT SDR 9',
      standard: 'ASTM F2623, SDR 9',
      material: 'none',
      wallBasis: 'average wall',
      source: astmF2623,
    },
    peRtSdr9,
  ),
  inchFamily(
    {
      name: 'CPVC SDR 11',
      standard: 'ASTM D2846, SDR 11',
      material: 'none',
      wallBasis: 'least wall',
      source: astmD2846,
    },
    cpvcSdr11,
  ),
  inchFamily(
    {
      name: 'CPVC schedule 80',
      standard: 'ASTM F441, schedule 80',
      material: 'none',
      wallBasis: 'least wall',
      source: astmF441,
    },
    cpvcSchedule80,
  ),
  wallFamily(
    {
      name: 'PP-R SDR 11',
      standard: 'ISO 15874-2, SDR 11',
      material: 'none',
      wallBasis: 'least wall',
      source: iso15874Part2,
    },
    ppRSdr11,
    true,
  ),
  wallFamily(
    {
      name: 'PP-R SDR 7.4',
      standard: 'ISO 15874-2, SDR 7.4',
      material: 'none',
      wallBasis: 'least wall',
      source: iso15874Part2,
    },
    ppRSdr7,
    true,
  ),
  wallFamily(
    {
      name: 'HDPE SDR 11',
      standard: 'ISO 4427-2, SDR 11',
      material: 'none',
      wallBasis: 'least wall',
      source: iso4427Part2,
    },
    hdpeSdr11,
    true,
  ),
]

/** Families by their name in a spec. */
export const pipeFamilies: Readonly<Record<string, PipeFamily>> = Object.fromEntries(
  families.map((each) => [each.name, each]),
)

/** Other accepted names of a family. */
export const pipeFamilyAliases: Readonly<Record<string, string>> = {
  'steel STD': 'steel schedule STD',
  'steel XS': 'steel schedule XS',
}
