import { layout, layoutSymbol, type Box } from '@coldfill/formula'
import type { ProjectResult } from '@coldfill/sizing'
import type { UnitSystem } from '@coldfill/units'
import type { FileChild } from 'docx'
import { fluidOf } from '../calculation/fluid-of.ts'
import { methodChecks } from '../calculation/method-checks.ts'
import { stepEquations } from '../calculation/step-equations.ts'
import {
  vesselCalculation,
  type CalculationSection,
  type InputLine,
  type StepLine,
  type VesselCalculation,
} from '../calculation/vessel-calculation.ts'
import { equationParagraph, equationThenText, paragraph, runningText, stepParagraph } from '../docx/paragraph.ts'
import { STYLE } from '../docx/styles.ts'
import { table } from '../docx/table.ts'
import { basisWords } from '../words/basis-words.ts'
import { findingWords, sentenceCase, statusWords, valueText } from '@coldfill/presentation'
import { gaugeRemark } from '../words/pressure-words.ts'
import { chosenVessel } from './chosen-vessel.ts'
import { figure } from './pictures.ts'
import { pressureKey } from './pressures.ts'
import { scheduleKey } from './schedules.ts'
import type { Section, SubmittalContext } from './section.ts'

type Vessel = ProjectResult['vessels'][number]

const isInput = (line: { is: string }): line is InputLine => line.is === 'input'
const isStep = (line: { is: string }): line is StepLine => line.is === 'step'

/** True where a person typed another number than the one shown: another unit, or more digits. */
const typedOtherwise = ({ authored, value }: InputLine): boolean =>
  authored !== undefined && Math.abs(Number.parseFloat(authored) - value) > 1e-9 * Math.abs(value)

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
      typedOtherwise(line) ? `${line.source}, written ${line.authored}` : line.source,
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

const ANSWERS: readonly (readonly [key: string, words: string])[] = [
  ['required-volume', 'required volume'],
  ['required-volume-each', 'each vessel'],
  ['fill-pressure', 'fill pressure'],
  ['precharge', 'precharge'],
  ['maximum-pressure', 'maximum pressure'],
]

/** The result in one sentence, in the digits of the schedule. */
const answer = (vessel: Vessel, { shown }: SubmittalContext): string => {
  if (vessel.status !== 'sized') return `${statusWords[vessel.status]}. ${sentenceCase(vessel.reason ?? '')}`
  const usual = ANSWERS.filter(([key]) => vessel.results[key])
  // A vessel without a volume, as a separator, is said by what its method gives.
  const given = Object.entries(vessel.results).map(([key, { name }]) => [key, name] as const)
  const parts = (usual.length > 0 ? usual : given).map(([key, words]) => `${words} ${shown(vessel, key)}`)
  return `${vessel.mark}: ${parts.join(', ')}.`
}

/** What has to hold for the method to have an answer, and that it does. */
const checkLines = (vessel: Vessel, calculation: VesselCalculation, context: SubmittalContext): FileChild[] => {
  const { functions } = calculation.scope
  const checks = methodChecks(vessel, calculation, context.options.units)
  if (checks.length === 0) return []
  return [
    context.headings.heading('Checks of the method', 3),
    ...checks.map((check) =>
      equationThenText(
        layout(check.condition, { functions }),
        check.holds ? 'holds' : `does not hold. ${check.message}`,
      ),
    ),
  ]
}

const vesselLines = (vessel: Vessel, context: SubmittalContext, first: boolean): FileChild[] => {
  const { result, options, headings, captions } = context
  const picture = context.pictures.acceptance.get(vessel)
  const hasPressures = [...context.pictures.pressures.keys()].some(({ id }) => id === vessel.system)
  const calculation = vesselCalculation(vessel, result, options.units, fluidOf(vessel).functions)
  const findings = result.findings.filter(
    (finding) => finding.path === vessel.path || finding.path.startsWith(`${vessel.path}.`),
  )
  return [
    headings.heading(`${vessel.mark}  ${sentenceCase(vessel.kind)}`, 2, !first),
    runningText([
      basisWords(vessel, result).join(' '),
      ' It is scheduled in ',
      captions.reference(scheduleKey(vessel.kind)),
      ...(hasPressures ? [' and its pressures are drawn in ', captions.reference(pressureKey(vessel.system))] : []),
      '.',
    ]),
    paragraph(answer(vessel, context), STYLE.answer),
    ...(picture ? figure(picture, `${vessel.mark}, water in the vessel against pressure`, captions) : []),
    ...(vessel.status === 'sized' ? chosenVessel(vessel, context) : []),
    ...findings.map((finding) => {
      const { message, hint } = findingWords(finding, options.units)
      return paragraph(`${sentenceCase(finding.severity)} ${finding.code}: ${message} ${hint}`, STYLE.remark)
    }),
    ...calculation.sections.flatMap((section) => sectionLines(section, vessel, calculation, context)),
    ...checkLines(vessel, calculation, context),
  ]
}

/** The worked calculation of every vessel: basis in words, inputs, each step as a native equation, the answer. */
export const calculations: Section = (context) => {
  const { result, options, headings } = context
  if (result.vessels.length === 0) return []
  return [
    headings.heading('Calculations', 1, true),
    paragraph(
      `Each step stands in symbols and then with its numbers. Shown digits give the shown result; the full numbers are in the schedule workbook. ${gaugeRemark(options.units)}`,
    ),
    ...result.vessels.flatMap((vessel, index) => vesselLines(vessel, context, index === 0)),
  ]
}
