import { vesselKindNames } from '@coldfill/spec'
import type { Kind } from '@coldfill/units'

interface Column {
  /** Heading of the column; a unit may follow in brackets and then holds for cells without one. */
  readonly heading: string
  readonly doc: string
  readonly required: boolean
  readonly holds: { readonly quantity: Kind } | { readonly choice: readonly string[] } | 'text' | 'yes or no' | 'kinds'
}

/** Columns of a vessel catalogue, CSV or workbook. The order is free; unknown columns are ignored with a word. */
export const catalogueColumns = [
  { heading: 'maker', doc: 'Who makes the vessel.', required: true, holds: 'text' },
  { heading: 'model', doc: 'The maker’s name for this size.', required: true, holds: 'text' },
  {
    heading: 'kind',
    doc: `Kinds of vessel it may serve, parted by a semicolon: ${vesselKindNames.slice(0, 5).join(', ')} …`,
    required: true,
    holds: 'kinds',
  },
  {
    heading: 'construction',
    doc: 'diaphragm, bladder, plain steel or open.',
    required: false,
    holds: { choice: ['diaphragm', 'bladder', 'plain steel', 'open'] },
  },
  { heading: 'volume', doc: 'Volume of the whole vessel.', required: true, holds: { quantity: 'volume' } },
  {
    heading: 'acceptance volume',
    doc: 'Water that it can take up; empty where the whole shell is usable.',
    required: false,
    holds: { quantity: 'volume' },
  },
  {
    heading: 'maximum pressure',
    doc: 'Highest working pressure, gauge.',
    required: true,
    holds: { quantity: 'gauge pressure' },
  },
  {
    heading: 'maximum temperature',
    doc: 'Highest working temperature.',
    required: true,
    holds: { quantity: 'temperature' },
  },
  { heading: 'potable', doc: 'Whether it is listed for drinking water.', required: true, holds: 'yes or no' },
  {
    heading: 'stamp',
    doc: 'Whether it carries the stamp of the pressure vessel code.',
    required: true,
    holds: 'yes or no',
  },
  {
    heading: 'mounting',
    doc: 'hung, floor or in line.',
    required: false,
    holds: { choice: ['hung', 'floor', 'in line'] },
  },
  { heading: 'diameter', doc: 'Outside diameter.', required: false, holds: { quantity: 'diameter' } },
  { heading: 'height', doc: 'Height or length.', required: false, holds: { quantity: 'diameter' } },
  { heading: 'weight empty', doc: 'Weight without water.', required: false, holds: { quantity: 'mass' } },
  { heading: 'connection', doc: 'Size of the system connection.', required: false, holds: 'text' },
] as const satisfies readonly Column[]

export type CatalogueHeading = (typeof catalogueColumns)[number]['heading']
