import { Calculation, type GivenValue } from '../../calculation.ts'
import { emitterClasses } from '../../assumptions/emitters.ts'
import { findPipe } from '../../pipes/find-pipe.ts'
import { contents, type ContentsLine } from '../../sections/contents.ts'
import { parseQuantity } from '@coldfill/units'
import { byFigures, figure, type VerificationCase } from '../case.ts'

const FOOT = 0.3048

const given = (value: number): GivenValue => ({ value, origin: { from: 'spec', path: '' } })

const volumeOf = (line: ContentsLine): number => {
  const section = contents([line])
  const calculation = new Calculation('contents', {})
  calculation.section('Contents')
  calculation.run(section.method, section.given)
  return calculation.value('V_s')
}

const pipe = (
  id: string,
  source: string,
  [family, size]: readonly [string, string],
  printed: string,
  origin: 'published' | 'from memory',
  tolerance: number,
  knownWrong?: string,
): VerificationCase =>
  byFigures(
    {
      id,
      source,
      title: `One foot of ${family}, ${size}`,
      origin,
      tolerance,
      because: 'Three or four printed digits of contents rounded from the bore.',
      ...(knownWrong === undefined ? {} : { knownWrong }),
    },
    figure('content of one foot', 'volume', `${printed} gal`, () => {
      const found = findPipe(family, size)
      if (!found.ok) throw new Error(`no ${family} ${size}`)
      return volumeOf({
        holds: 'pipe',
        label: size,
        insideDiameter: given(found.row.insideDiameter),
        length: given(FOOT),
      })
    }),
  )

const b88 = 'ASTM B88 type L, contents as tabulated by the handbook of the copper industry'
const copper = (id: string, size: string, printed: string, knownWrong?: string): VerificationCase =>
  pipe(id, b88, ['copper type L', size], printed, 'published', 0.012, knownWrong)

const b36 = 'ASME B36.10M, schedule 40'
const steel = (id: string, size: string, printed: string, tolerance = 0.005): VerificationCase =>
  pipe(id, b36, ['steel schedule 40', size], printed, 'from memory', tolerance)

const estimate = (id: string, source: string, emitter: string, printed: string): VerificationCase =>
  byFigures(
    {
      id,
      source,
      title: `Content of 500 kW, ${emitter}`,
      origin: 'derived',
      tolerance: 0.001,
      because: 'Arithmetic only.',
    },
    figure('content', 'volume', printed, () => {
      const read = parseQuantity(emitterClasses[emitter]?.value ?? '', ['volume per power'])
      if (!read.ok) throw new Error(`no content of ${emitter}`)
      return volumeOf({
        holds: 'estimate',
        label: emitter,
        output: given(500e3),
        content: given(read.quantity.value),
      })
    }),
  )

/** Contents of pipes and systems. */
export const contentsCases: readonly VerificationCase[] = [
  copper('V01_1_4', '1/4 in', '0.00405'),
  copper('V01_3_8', '3/8 in', '0.00753'),
  copper('V01_1_2', '1/2 in', '0.0121'),
  copper('V01_5_8', '5/8 in', '0.0174', 'The table is 4 % below its own bore of 0.666 in, which gives 0.0181.'),
  copper('V01_3_4', '3/4 in', '0.0251'),
  copper('V01_1', '1 in', '0.0429'),
  copper('V01_1-1_4', '1-1/4 in', '0.0655'),
  copper('V01_1-1_2', '1-1/2 in', '0.0925'),
  copper('V01_2', '2 in', '0.161'),
  copper('V01_3', '3 in', '0.354'),
  copper('V01_3-1_2', '3-1/2 in', '0.478'),
  copper('V01_4', '4 in', '0.571', 'The table is wrong for its own bore of 3.905 in, which gives 0.622.'),
  copper('V01_5', '5 in', '0.971'),
  copper('V01_8', '8 in', '2.44'),
  copper('V01_10', '10 in', '3.78'),
  copper('V01_12', '12 in', '5.45'),
  // The bore follows from diameter and wall in mm, 21.3 and 2.77; in inches it is 0.25 % wider.
  steel('V02_1_2', '1/2 in', '0.0158', 0.0065),
  steel('V02_3_4', '3/4 in', '0.0277'),
  steel('V02_1', '1 in', '0.0449'),
  steel('V02_1-1_4', '1-1/4 in', '0.0777'),
  steel('V02_1-1_2', '1-1/2 in', '0.1058'),
  steel('V02_2', '2 in', '0.1743'),
  steel('V02_2-1_2', '2-1/2 in', '0.2487'),
  steel('V02_4', '4 in', '0.6613'),
  steel('V02_6', '6 in', '1.501'),
  steel('V02_10', '10 in', '4.096'),
  steel('V02_12', '12 in', '5.815'),
  estimate('V03', 'Calculation sheet in the form of BS 7074: 12 L/kW heating', 'heating plant', '6000 L'),
  estimate('V03_chilled', 'Calculation sheet in the form of BS 7074: 18 L/kW chilled water', 'chilled plant', '9000 L'),
  pipe(
    'V06',
    'ASPE Plumbing Engineering Design Handbook, volume 4, pipe volumes',
    ['steel schedule 40', '4 in'],
    '0.67',
    'from memory',
    0.02,
  ),
]
