import { ImageRun, Paragraph, type FileChild } from 'docx'
import { peopleOf, revisionWords, type DocumentOptions, type Logo } from '../document-options.ts'
import { paragraph } from '../docx/paragraph.ts'
import { plainText } from '../docx/plain-text.ts'
import { STYLE } from '../docx/styles.ts'
import { table } from '../docx/table.ts'
import { caution } from '../words/cautions.ts'
import type { Section } from './section.ts'

const DISPOSITIONS = ['Accepted', 'Accepted as noted', 'Revise and resubmit', 'Rejected', 'For information']

/** Most room for a logo, in pixels of 96 to the inch. */
const [LOGO_WIDTH, LOGO_HEIGHT] = [220, 70]

const logoParagraph = ({ data, type, width, height }: Logo, office: string): FileChild => {
  const scale = Math.min(LOGO_WIDTH / width, LOGO_HEIGHT / height)
  const words = plainText(office === '' ? 'Logo' : `Logo of ${office}`)
  return new Paragraph({
    style: STYLE.figure,
    children: [
      new ImageRun({
        type,
        data,
        transformation: { width: Math.round(width * scale), height: Math.round(height * scale) },
        altText: { title: words, description: words, name: words },
      }),
    ],
  })
}

/** What the reviewers decided, or rows for a pen. */
const dispositionBlock = ({ dispositions, outcomes }: DocumentOptions, width: number): FileChild => {
  const given = dispositions !== undefined && dispositions.length > 0
  return table({
    title: 'Disposition block',
    description: given
      ? 'What each reviewer decided on this issue, when and why'
      : 'One row an outcome; the reviewer signs the row that applies. Revise and Rejected need a reason.',
    width,
    ...(given ? {} : { rowHeight: 340 }),
    columns: [
      { heading: 'Outcome', width: 24 },
      { heading: 'Reviewer', width: 24 },
      { heading: 'Date', width: 14 },
      { heading: 'Reason or remarks', width: 38 },
    ],
    rows: given
      ? dispositions.map(({ outcome, reviewer, date, reason, stale }) => [
          stale ? `${outcome} (on earlier content)` : outcome,
          reviewer,
          date.slice(0, 10),
          reason,
        ])
      : (outcomes ?? DISPOSITIONS).map((outcome) => [outcome, '', '', '']),
  })
}

/** Title block, revision block and disposition block on the first page. */
export const cover: Section = ({ result, options, width }) => {
  const { project } = result
  const { titleBlock, revisions, contentHash } = options
  const sections = Object.entries(project.specSections).map(([kind, section]) => `${section} (${kind})`)
  const codes = Object.entries(project.codes).map(([kind, code]) => `${code} (${kind})`)
  const people = peopleOf(titleBlock)
  const address = titleBlock.lines?.join(' · ') ?? ''
  const fields: (readonly [string, string])[] = [
    ['Project', `${project.number}, ${project.title}`],
    ['Client', project.client],
    ['Location', project.location],
    ['Document', 'Submittal: vessel schedules and calculations'],
    ['Spec sections', sections.join(', ')],
    ['Adopted codes', codes.join(', ')],
    ['Office', titleBlock.office],
    ['Address', address],
    ...people,
    ['Date of issue', titleBlock.date.slice(0, 10)],
    ['Revision', revisionWords(titleBlock.revision)],
    ['Status', titleBlock.status],
    ['Units', options.units],
    ['Sized with', `Coldfill engine ${result.engine}, spec version ${result.spec}`],
    ...(contentHash === undefined ? [] : [['Content hash (SHA-256)', contentHash] as [string, string]]),
  ]
  const kept = fields.filter((field) => field[1] !== '' || people.includes(field))
  return [
    ...(options.logo ? [logoParagraph(options.logo, titleBlock.office)] : []),
    paragraph('SUBMITTAL', STYLE.zone),
    paragraph(project.title, 'Title'),
    paragraph('Expansion tanks and vessels: schedules and calculations', 'Subtitle'),
    table({
      title: 'Title block',
      description: 'Project, office, people, date, revision and status of this submittal',
      width,
      strongFirst: true,
      columns: [
        { heading: 'Title block', width: 22 },
        { heading: '', width: 78 },
      ],
      rows: kept,
    }),
    ...(options.override
      ? [
          paragraph(
            `Gates overridden. ${options.override.by} issued this for construction on ${options.override.date.slice(0, 10)} although a gate did not pass: ${options.override.reason}`,
            STYLE.answer,
          ),
        ]
      : []),
    paragraph('REVISIONS', STYLE.zone),
    table({
      title: 'Revision block',
      description: 'Issues of this submittal, newest first',
      width,
      columns: [
        { heading: 'Rev', width: 12 },
        { heading: 'Date', width: 14 },
        { heading: 'Purpose', width: 52 },
        { heading: 'By', width: 22 },
      ],
      rows:
        revisions.length > 0
          ? revisions.map((entry) => [entry.revision || '–', entry.date.slice(0, 10), entry.purpose, entry.by])
          : [['–', '', 'Not issued yet', '']],
    }),
    paragraph('DISPOSITION', STYLE.zone),
    dispositionBlock(options, width),
    paragraph(caution, STYLE.remark),
  ]
}
