import { layoutSymbol } from '@coldfill/formula'
import type { ProjectResult } from '@coldfill/sizing'
import { unitLabel, type Kind, type UnitSystem } from '@coldfill/units'
import type { FileChild } from 'docx'
import { displayNumber, numberText, sentenceCase, valueText } from '@coldfill/presentation'
import { paragraph } from '../docx/paragraph.ts'
import { STYLE } from '../docx/styles.ts'
import { table } from '../docx/table.ts'
import type { SubmittalContext } from './section.ts'

type Vessel = ProjectResult['vessels'][number]

/** Shown digits of a chosen vessel and of the headroom table. */
const DIGITS = 4

const chosenWords = ({ selected }: Vessel, units: UnitSystem): string => {
  if (selected === null) return 'No vessel is chosen in the spec.'
  const said = (value: number, kind: Kind) =>
    valueText({
      value: Number(displayNumber(value, kind, units).toPrecision(DIGITS)),
      unit: unitLabel(kind, units),
    })
  const parts = [
    `${said(selected.volume, 'volume')} each`,
    ...(selected.acceptance === undefined ? [] : [`acceptance ${said(selected.acceptance, 'volume')}`]),
    `rated ${said(selected.maxPressure, 'gauge pressure')} and ${said(selected.maxTemperature, 'temperature')}`,
    selected.stamped ? 'stamped' : 'not stamped',
  ]
  const many = selected.quantity > 1 ? `${selected.quantity} × ` : ''
  return `Chosen: ${many}${selected.maker} ${selected.model}, ${parts.join(', ')}.`
}

/** The limit in few digits, rounded towards the present value, so that what is printed is still enough. */
const limitText = (limit: number, value: number, kind: Kind): string => {
  if (kind === 'count') return numberText(limit > value ? Math.floor(limit + 1e-9) : Math.ceil(limit - 1e-9))
  const step = 10 ** (Math.floor(Math.log10(Math.abs(limit) || 1)) + 1 - DIGITS)
  const rounded = limit > value ? Math.floor(limit / step + 1e-9) : Math.ceil(limit / step - 1e-9)
  return numberText(Number((rounded * step).toPrecision(DIGITS)))
}

/** The chosen vessel, and how far each input may move before it stops being enough. */
export const chosenVessel = (vessel: Vessel, { options, captions, width }: SubmittalContext): FileChild[] => {
  const { units } = options
  if (vessel.headroom.length === 0) return [paragraph(chosenWords(vessel, units))]
  const volume = unitLabel('volume', units)
  const chosen = vessel.selected !== null
  const rows = vessel.headroom.map((row) => {
    const unit = unitLabel(row.kind, units)
    const value = displayNumber(row.value, row.kind, units)
    // A step of one shown unit, so that the change reads off the table: 1 °F, 1 psi, 1 gal.
    const step = displayNumber(1, row.kind, units) - displayNumber(0, row.kind, units)
    const change = displayNumber(row.sensitivity / step, 'volume', units)
    const limit = row.limit === null ? null : displayNumber(row.limit, row.kind, units)
    return [
      layoutSymbol(row.symbol),
      sentenceCase(row.name),
      `${numberText(Number(value.toPrecision(DIGITS)))} ${unit}`.trimEnd(),
      `${change > 0 ? '+' : ''}${numberText(Number(change.toPrecision(3))).replace(/^-/, '−')} ${volume} a ${unit || 'unit'}`,
      ...(chosen ? [limit === null ? 'any' : `${limitText(limit, value, row.kind)} ${unit}`.trimEnd()] : []),
    ]
  })
  const title = chosen ? 'headroom with the chosen vessel' : 'what moves the required volume'
  return [
    paragraph(chosenWords(vessel, units)),
    captions.next(`${vessel.mark}, ${title}`),
    table({
      title: `${vessel.mark}, ${title}`,
      description: chosen
        ? 'How the required volume answers to each input, and how far the input may go with the chosen vessel'
        : 'How the required volume answers to each input',
      width,
      columns: [
        { heading: 'Symbol', width: 9 },
        { heading: 'Input', width: 35 },
        { heading: 'Now', width: 16, align: 'right' },
        { heading: 'Required volume changes by', width: 24, align: 'right' },
        ...(chosen ? [{ heading: 'May go to', width: 16, align: 'right' as const }] : []),
      ],
      rows,
    }),
    ...(chosen && vessel.headroom.some((row) => row.limit === null)
      ? [paragraph('Any: no value of this input alone makes the chosen vessel too small.', STYLE.remark)]
      : []),
  ]
}
