import type { Source } from '../citation.ts'
import { ashraeFundamentals } from './ashrae-fundamentals.ts'
import { ashraeHvacSe } from './ashrae-hvac-se.ts'
import { ashraeServiceWater } from './ashrae-service-water.ts'
import { asmeB319 } from './asme-b31-9.ts'
import { aspeDomesticHotWater } from './aspe-domestic-hot-water.ts'
import { aspeExpansion } from './aspe-expansion.ts'
import { boyle } from './boyle.ts'
import { bs7074 } from './bs-7074.ts'
import { bs7074Sheet } from './bs-7074-sheet.ts'
import { commonPractice } from './common-practice.ts'
import { din4708Part2 } from './din-4708-2.ts'
import { din4807Part2 } from './din-4807-2.ts'
import { din4807Part5 } from './din-4807-5.ts'
import { en12828 } from './en-12828.ts'
import { frenchHeatingMethod } from './french-heating-method.ts'
import { geometry } from './geometry.ts'
import { hydrostatics } from './hydrostatics.ts'
import { imc } from './imc.ts'
import { ipc } from './ipc.ts'
import { michiganR4084272 } from './michigan-r408-4272.ts'
import { propertySources } from './properties.ts'
import { raccoltaR } from './raccolta-r.ts'
import { umc } from './umc.ts'
import { une100155 } from './une-100155.ts'
import { uneWorkedSheet } from './une-worked-sheet.ts'
import { upc } from './upc.ts'
import { heatBalance } from './heat-balance.ts'
import { hydronicsColumn } from './hydronics-column.ts'
import { en3035 } from './en-303-5.ts'
import { chillerPractice } from './chiller-practice.ts'
import { groundwaterColumn } from './groundwater-column.ts'
import { waDoh } from './wa-doh.ts'
import { tenStates } from './ten-states.ts'
import { idaho580108 } from './idaho-58-01-08.ts'
import { idae022 } from './idae-022.ts'
import { hydronicsArticle } from './hydronics-article.ts'
import { nb27 } from './nb-27.ts'
import { iapwsSr186 } from './iapws-sr1-86.ts'
import { ashraeFlashArticle } from './ashrae-flash-article.ts'
import { steamColumnist } from './steam-columnist.ts'
import { en806 } from './en-806.ts'
import { aspeHotWater } from './aspe-hot-water.ts'
import { en128313 } from './en-12831-3.ts'
import { din4708Article } from './din-4708-article.ts'
import { verificationEvaluation } from './verification-evaluation.ts'

const all: readonly Source[] = [
  ashraeFundamentals,
  ashraeHvacSe,
  ashraeServiceWater,
  asmeB319,
  aspeDomesticHotWater,
  aspeExpansion,
  boyle,
  bs7074,
  bs7074Sheet,
  commonPractice,
  din4708Part2,
  din4807Part2,
  din4807Part5,
  en12828,
  frenchHeatingMethod,
  geometry,
  hydrostatics,
  imc,
  ipc,
  michiganR4084272,
  raccoltaR,
  umc,
  une100155,
  uneWorkedSheet,
  upc,
  heatBalance,
  hydronicsColumn,
  en3035,
  chillerPractice,
  groundwaterColumn,
  waDoh,
  tenStates,
  idaho580108,
  idae022,
  hydronicsArticle,
  nb27,
  iapwsSr186,
  ashraeFlashArticle,
  steamColumnist,
  en806,
  aspeHotWater,
  en128313,
  din4708Article,
  verificationEvaluation,
  ...propertySources,
]

/** Every publication the program cites, by id. */
export const sources: Readonly<Record<string, Source>> = Object.fromEntries(all.map((source) => [source.id, source]))
