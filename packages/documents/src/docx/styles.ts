import { AlignmentType, BorderStyle, ImportedXmlComponent, type IStylesOptions } from 'docx'
import { BODY_FONT, HAIR, INK, OCHRE, PENCIL, RULE, WELL } from '../look.ts'

/** Paragraph styles beside the built-in ones. */
export const STYLE = {
  tableText: 'TableText',
  tableNumber: 'TableNumber',
  tableHead: 'TableHead',
  scheduleText: 'ScheduleText',
  scheduleNumber: 'ScheduleNumber',
  scheduleHead: 'ScheduleHead',
  step: 'CalculationStep',
  equation: 'CalculationEquation',
  answer: 'CalculationAnswer',
  remark: 'Remark',
  zone: 'Zone',
  draft: 'DraftWarning',
  note: 'KeyedNote',
} as const

/** Character style of where a value comes from. */
export const SOURCE_STYLE = 'Source'

export const TABLE_STYLE = 'ColdfillTable'

const pen = (color: string, size: number) => ({ style: BorderStyle.SINGLE, size, color, space: 1 })

// Heavy rule above and below the head, hair lines between rows, no vertical lines: the look of the screen's tables.
const tableStyle = `<w:style xmlns:w="http://schemas.openxmlformats.org/wordprocessingml/2006/main" w:type="table" w:customStyle="1" w:styleId="${TABLE_STYLE}">
<w:name w:val="Coldfill Table"/><w:basedOn w:val="TableNormal"/><w:uiPriority w:val="59"/><w:qFormat/>
<w:tblPr><w:tblBorders><w:top w:val="single" w:sz="12" w:space="0" w:color="${INK}"/><w:bottom w:val="single" w:sz="12" w:space="0" w:color="${INK}"/><w:insideH w:val="single" w:sz="4" w:space="0" w:color="${HAIR}"/></w:tblBorders>
<w:tblCellMar><w:top w:w="30" w:type="dxa"/><w:left w:w="70" w:type="dxa"/><w:bottom w:w="30" w:type="dxa"/><w:right w:w="70" w:type="dxa"/></w:tblCellMar></w:tblPr>
<w:tblStylePr w:type="firstRow"><w:tcPr><w:tcBorders><w:bottom w:val="single" w:sz="8" w:space="0" w:color="${INK}"/></w:tcBorders><w:shd w:val="clear" w:color="auto" w:fill="${WELL}"/></w:tcPr></w:tblStylePr>
</w:style>`

const table = (id: string, name: string, size: number, alignment: 'left' | 'right', bold = false) => ({
  id,
  name,
  basedOn: 'Normal',
  quickFormat: true,
  run: { size, ...(bold ? { bold: true } : {}) },
  paragraph: { alignment, spacing: { before: 0, after: 0, line: 240 } },
})

/** Every look of the submittal: paragraphs name a style and carry no formatting of their own. Sizes are half points. */
export const styles: IStylesOptions = {
  importedStyles: [ImportedXmlComponent.fromXmlString(tableStyle)],
  default: {
    document: {
      run: { font: BODY_FONT, size: 19, color: INK, language: { value: 'en-US' } },
      paragraph: { spacing: { after: 100, line: 264 } },
    },
    title: {
      run: { size: 52, bold: true, color: INK },
      paragraph: { spacing: { before: 0, after: 60, line: 240 } },
    },
    heading1: {
      run: { size: 32, bold: true, color: INK },
      paragraph: {
        spacing: { before: 0, after: 160 },
        keepNext: true,
        border: { bottom: pen(INK, 12) },
      },
    },
    heading2: {
      run: { size: 24, bold: true, color: INK },
      paragraph: { spacing: { before: 320, after: 100 }, keepNext: true },
    },
    heading3: {
      run: { size: 20, bold: true, color: PENCIL },
      paragraph: { spacing: { before: 240, after: 80 }, keepNext: true },
    },
    caption: {
      run: { size: 17, color: PENCIL, bold: false, italics: false },
      paragraph: { spacing: { before: 160, after: 60 }, keepNext: true },
    },
  },
  characterStyles: [
    { id: 'Strong', name: 'Strong', basedOn: 'DefaultParagraphFont', run: { bold: true } },
    { id: SOURCE_STYLE, name: 'Source', basedOn: 'DefaultParagraphFont', run: { size: 16, color: PENCIL } },
  ],
  paragraphStyles: [
    {
      id: 'ContentsHeading',
      name: 'TOC Heading',
      basedOn: 'Normal',
      run: { size: 32, bold: true },
      paragraph: { spacing: { before: 0, after: 160 }, border: { bottom: pen(INK, 12) } },
    },
    {
      id: 'Subtitle',
      name: 'Subtitle',
      basedOn: 'Normal',
      run: { size: 26, color: PENCIL },
      paragraph: { spacing: { after: 360 } },
    },
    {
      id: 'Header',
      name: 'header',
      basedOn: 'Normal',
      run: { size: 16, color: PENCIL },
      paragraph: { spacing: { after: 0 }, border: { bottom: pen(RULE, 4) } },
    },
    {
      id: 'Footer',
      name: 'footer',
      basedOn: 'Normal',
      run: { size: 16, color: PENCIL },
      paragraph: { spacing: { after: 0 }, border: { top: pen(RULE, 4) } },
    },
    ...([1, 2, 3] as const).map((level) => ({
      id: `TOC${level}`,
      name: `toc ${level}`,
      basedOn: 'Normal',
      run: { bold: level === 1 },
      paragraph: {
        indent: { left: (level - 1) * 300 },
        spacing: { before: level === 1 ? 120 : 0, after: 20 },
      },
    })),
    table(STYLE.tableText, 'Table Text', 17, 'left'),
    table(STYLE.tableNumber, 'Table Number', 17, 'right'),
    table(STYLE.tableHead, 'Table Head', 16, 'left', true),
    table(STYLE.scheduleText, 'Schedule Text', 15, 'left'),
    table(STYLE.scheduleNumber, 'Schedule Number', 15, 'right'),
    table(STYLE.scheduleHead, 'Schedule Head', 14, 'left', true),
    {
      id: STYLE.step,
      name: 'Calculation Step',
      basedOn: 'Normal',
      next: STYLE.equation,
      paragraph: { keepNext: true, keepLines: true, spacing: { before: 140, after: 20 } },
    },
    {
      id: STYLE.equation,
      name: 'Calculation Equation',
      basedOn: 'Normal',
      paragraph: { keepLines: true, indent: { left: 360 }, spacing: { before: 0, after: 20 } },
    },
    {
      id: STYLE.answer,
      name: 'Calculation Answer',
      basedOn: 'Normal',
      run: { bold: true },
      paragraph: {
        keepLines: true,
        spacing: { before: 200, after: 120 },
        border: { top: pen(INK, 8), bottom: pen(INK, 8) },
      },
    },
    {
      id: STYLE.remark,
      name: 'Remark',
      basedOn: 'Normal',
      run: { size: 16, color: PENCIL },
      paragraph: { spacing: { before: 40, after: 60 } },
    },
    {
      id: STYLE.zone,
      name: 'Zone',
      basedOn: 'Normal',
      run: { size: 16, color: PENCIL, bold: true, characterSpacing: 20 },
      paragraph: { spacing: { before: 240, after: 60 }, keepNext: true },
    },
    {
      id: STYLE.draft,
      name: 'Draft Warning',
      basedOn: 'Normal',
      run: { size: 18, bold: true, color: OCHRE },
      paragraph: { alignment: AlignmentType.CENTER, spacing: { before: 0, after: 60 } },
    },
    {
      id: STYLE.note,
      name: 'Keyed Note',
      basedOn: 'Normal',
      run: { size: 16 },
      paragraph: {
        indent: { left: 360, hanging: 360 },
        spacing: { before: 0, after: 30 },
      },
    },
  ],
}
