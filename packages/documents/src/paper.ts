import type { UnitSystem } from '@coldfill/units'
import type { DocumentOptions } from './document-options.ts'

const USUAL: Record<UnitSystem, 'Letter' | 'A4'> = { US: 'Letter', SI: 'A4' }

export const paperOf = (options: DocumentOptions): 'Letter' | 'A4' => options.paper ?? USUAL[options.units]
