import { layoutSymbol, type Box } from '@coldfill/formula'
import type { ProjectResult } from '@coldfill/sizing'
import type { UnitSystem } from '@coldfill/units'
import type { FileChild } from 'docx'
import { fluidOf } from '../calculation/fluid-of.ts'
import { stepEquations } from '../calculation/step-equations.ts'
import {
  vesselCalculation,
  type CalculationSection,
  type InputLine,
  type StepLine,
  type VesselCalculation,
} from '../calculation/vessel-calculation.ts'
import { equationParagraph, paragraph, stepParagraph } from '../docx/paragraph.ts'
import { STYLE } from '../docx/styles.ts'
import { table } from '../docx/table.ts'
import { basisWords } from '../words/basis-words.ts'
import { valueText } from '../calculation/value-text.ts'
import { gaugeRemark } from '../words/pressure-words.ts'
import { sentenceCase, statusWords } from '../words/vessel-words.ts'
import type { Section, SubmittalContext } from './section.ts'

type Vessel = ProjectResult['vessels'][number]

const isInput = (line: { is: string }): line is InputLine => line.is === 'input'
const isStep = (line: { is: string }): line is StepLine => line.is === 'step'

const inputTable = (inputs: readonly InputLine[], mark: string, title: string, width: number): FileChild =>
  table({
    title: `${mark}, ${title}: inputs`,
    description: 'Symbol, name, value and source of each input of this part of the calculation',
    width,
    columns: [
      { heading: 'Symbol', width: 9 },
      { heading: 'Input', width: 35 },
      { heading: 'Value', width: 18, align: 'right' },
      { heading: 'Source', width: 38 },
    ],
    rows: inputs.map((line) => [
      layoutSymbol(line.symbol),
      sentenceCase(line.name),
      valueText(line),
      line.authored && line.authored !== valueText(line) ? `${line.source}, written ${line.authored}` : line.source,
    ]),
  })

/** A step in three lines: its name and source, the formula in symbols, the same with its numbers. */
const stepLines = (step: StepLine, calculation: VesselCalculation, units: UnitSystem): FileChild[] => {
  const { symbols, numbers } = stepEquations(step, calculation, units)
  const lines: Box[] = [symbols, numbers]
  return [
    stepParagraph(sentenceCase(step.name), step.source),
    ...lines.map((box, index) => equationParagraph(box, index < lines.length - 1)),
  ]
}

const sectionLines = (
  section: CalculationSection,
  vessel: Vessel,
  calculation: VesselCalculation,
  { headings, options, width }: SubmittalContext,
): FileChild[] => {
  const inputs = section.lines.filter(isInput)
  return [
    headings.heading(section.title, 3),
    ...(inputs.length > 0 ? [inputTable(inputs, vessel.mark, section.title, width)] : []),
    ...section.lines.filter(isStep).flatMap((step) => stepLines(step, calculation, options.units)),
  ]
}

const answer = (vessel: Vessel, calculation: VesselCalculation): string => {
  if (vessel.status !== 'sized') return `${statusWords[vessel.status]}. ${sentenceCase(vessel.reason ?? '')}`
  const lines = calculation.sections.flatMap((section) => section.lines)
  const said = (key: string, words: string): string[] => {
    const line = lines.find((candidate) => candidate.id === vessel.results[key]?.entry)
    return line ? [`${words} ${valueText(line)}`] : []
  }
  const parts = [
    ...said('required-volume', 'required volume'),
    ...said('required-volume-each', 'of which each vessel'),
    ...said('precharge', 'precharge'),
    ...said('fill-pressure', 'fill pressure'),
    ...said('maximum-pressure', 'maximum pressure'),
  ]
  return `${vessel.mark}: ${parts.join(', ')}.`
}

const chosen = (vessel: Vessel): string =>
  vessel.selected === null
    ? 'No vessel is chosen yet; any that meets the volume, the pressures and the temperatures above will do.'
    : `Chosen: ${vessel.selected.quantity > 1 ? `${vessel.selected.quantity} × ` : ''}${vessel.selected.maker} ${vessel.selected.model}.`

const vesselLines = (vessel: Vessel, context: SubmittalContext): FileChild[] => {
  const { result, options, headings } = context
  const calculation = vesselCalculation(vessel, result, options.units, fluidOf(vessel.fluid).functions)
  const findings = result.findings.filter(
    (finding) => finding.path === vessel.path || finding.path.startsWith(`${vessel.path}.`),
  )
  return [
    headings.heading(`${vessel.mark}  ${sentenceCase(vessel.kind)}`, 2),
    ...basisWords(vessel, result).map((sentence) => paragraph(sentence)),
    paragraph(answer(vessel, calculation), STYLE.answer),
    ...(vessel.status === 'sized' ? [paragraph(chosen(vessel))] : []),
    ...findings.map((finding) =>
      paragraph(`${sentenceCase(finding.severity)} ${finding.code}: ${finding.message} ${finding.hint}`, STYLE.remark),
    ),
    ...calculation.sections.flatMap((section) => sectionLines(section, vessel, calculation, context)),
  ]
}

/** The worked calculation of every vessel: basis in words, inputs, each step as a native equation, the answer. */
export const calculations: Section = (context) => {
  const { result, options, headings } = context
  if (result.vessels.length === 0) return []
  return [
    headings.heading('Calculations', 1),
    paragraph(
      `Each step stands in symbols and then with its numbers. Shown digits give the shown result; the full numbers are in the schedule workbook. ${gaugeRemark(options.units)}`,
    ),
    ...result.vessels.flatMap((vessel) => vesselLines(vessel, context)),
  ]
}
