import { runningText } from '../docx/paragraph.ts'
import { scheduleKinds, sentenceCase, statusWords } from '@coldfill/presentation'
import { table } from '../docx/table.ts'
import { scheduleKey } from './schedules.ts'
import type { Section } from './section.ts'

const counted = (count: number, one: string): string => `${count} ${one}${count === 1 ? '' : 's'}`

/** Every vessel on one table, and in words how many could not be sized. */
export const summary: Section = ({ result, headings, captions, shown, width }) => {
  const { vessels } = result
  const kinds = scheduleKinds(result)
  const unsized = vessels.filter((vessel) => vessel.status !== 'sized')
  const sentences = [
    `This submittal covers ${counted(vessels.length, 'vessel')} in ${counted(result.systems.length, 'system')}.`,
    ...(unsized.length === 0
      ? ['Every vessel is sized.']
      : [
          `${counted(unsized.length, 'vessel')} ${unsized.length === 1 ? 'has' : 'have'} no size; the reason stands in the table and in the notes of the schedule.`,
        ]),
  ]
  return [
    headings.heading('Summary', 1, true),
    runningText([
      sentences.join(' '),
      ...(kinds.length > 0 ? [' The schedules are '] : []),
      ...kinds.flatMap((kind, index) => [
        ...(index > 0 ? [index === kinds.length - 1 ? ' and ' : ', '] : []),
        captions.reference(scheduleKey(kind)),
      ]),
      ...(kinds.length > 0 ? ['.'] : []),
      ...(result.assumptions.length > 0
        ? [
            ' Each number is worked out under Calculations, each default is listed in ',
            captions.reference('assumptions'),
            '.',
          ]
        : []),
    ]),
    captions.next('Vessels of the project'),
    table({
      title: 'Vessels of the project',
      description: 'Mark, system served, kind, required volume, chosen vessel, precharge and state of every vessel',
      width,
      strongFirst: true,
      columns: [
        { heading: 'Mark', width: 10 },
        { heading: 'Serves', width: 20 },
        { heading: 'Kind', width: 20 },
        { heading: 'Required volume', width: 12, align: 'right' },
        { heading: 'Precharge', width: 12, align: 'right' },
        { heading: 'State', width: 26 },
      ],
      rows: vessels.map((vessel) => [
        vessel.mark,
        vessel.serves,
        sentenceCase(vessel.kind),
        shown(vessel, 'required-volume'),
        shown(vessel, 'precharge'),
        vessel.status === 'sized' || !vessel.reason
          ? statusWords[vessel.status]
          : `${statusWords[vessel.status]}: ${vessel.reason}`,
      ]),
    }),
  ]
}
