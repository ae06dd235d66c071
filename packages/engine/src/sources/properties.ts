import type { Source } from '../citation.ts'
import { asmeB36Part10 } from './asme-b36-10m.ts'
import { asmeB36Part19 } from './asme-b36-19m.ts'
import { ashraeFundamentals2005 } from './ashrae-fundamentals-2005.ts'
import { astmB88 } from './astm-b88.ts'
import { astmD2846 } from './astm-d2846.ts'
import { astmF2623 } from './astm-f2623.ts'
import { astmF441 } from './astm-f441.ts'
import { astmF876 } from './astm-f876.ts'
import { en10255 } from './en-10255.ts'
import { en1057 } from './en-1057.ts'
import { iapwsR7 } from './iapws-r7-97.ts'
import { iso15874Part2 } from './iso-15874-2.ts'
import { iso4427Part2 } from './iso-4427-2.ts'
import { melinder2010 } from './melinder-2010.ts'

/** Publications behind the properties of fluids and the dimensions of pipes. */
export const propertySources: readonly Source[] = [
  asmeB36Part10,
  asmeB36Part19,
  ashraeFundamentals2005,
  astmB88,
  astmD2846,
  astmF2623,
  astmF441,
  astmF876,
  en10255,
  en1057,
  iapwsR7,
  iso15874Part2,
  iso4427Part2,
  melinder2010,
]
