import { BODY_FONT, HAIR, INK, OCHRE, PENCIL, RULE, WELL } from '../look.ts'
import { styleXml, type StyleDefinition } from './style-xml.ts'

/** Paragraph styles beside the built-in ones. */
export const STYLE = {
  tableText: 'TableText',
  tableNumber: 'TableNumber',
  tableHead: 'TableHead',
  tableHeadNumber: 'TableHeadNumber',
  scheduleText: 'ScheduleText',
  scheduleNumber: 'ScheduleNumber',
  scheduleHead: 'ScheduleHead',
  scheduleHeadNumber: 'ScheduleHeadNumber',
  smallText: 'SmallScheduleText',
  smallNumber: 'SmallScheduleNumber',
  smallHead: 'SmallScheduleHead',
  smallHeadNumber: 'SmallScheduleHeadNumber',
  step: 'CalculationStep',
  equation: 'CalculationEquation',
  answer: 'CalculationAnswer',
  remark: 'Remark',
  zone: 'Zone',
  draft: 'DraftWarning',
  note: 'KeyedNote',
  figure: 'Figure',
  figureCaption: 'FigureCaption',
  caution: 'Caution',
} as const

/** Character style of where a value comes from. */
export const SOURCE_STYLE = 'Source'
/** Character styles of a symbol among words and of its subscript. */
export const SYMBOL_STYLE = 'Symbol'
export const SUBSCRIPT_STYLE = 'SymbolSubscript'
export const TABLE_STYLE = 'ColdfillTable'

const heavy = { color: INK, size: 12 }
const fine = { color: RULE, size: 4 }
const tight = { before: 0, after: 0, line: 240 }

/** Every look of the submittal: paragraphs name a style and carry no formatting of their own. */
const DEFINITIONS: readonly StyleDefinition[] = [
  { id: 'Normal', name: 'Normal' },
  { id: 'DefaultParagraphFont', name: 'Default Paragraph Font', type: 'character' },
  { id: 'Title', name: 'Title', size: 52, bold: true, before: 0, after: 40, line: 240 },
  { id: 'Subtitle', name: 'Subtitle', size: 24, color: PENCIL, after: 280 },
  {
    id: 'Heading1',
    name: 'heading 1',
    next: 'Normal',
    size: 32,
    bold: true,
    before: 240,
    after: 180,
    keepNext: true,
    outline: 0,
    bottom: heavy,
  },
  {
    id: 'Heading2',
    name: 'heading 2',
    next: 'Normal',
    size: 24,
    bold: true,
    before: 320,
    after: 100,
    keepNext: true,
    outline: 1,
  },
  {
    id: 'Heading3',
    name: 'heading 3',
    next: 'Normal',
    size: 20,
    bold: true,
    color: PENCIL,
    before: 260,
    after: 80,
    keepNext: true,
    outline: 2,
  },
  { id: 'Caption', name: 'caption', next: 'Normal', size: 17, color: PENCIL, before: 160, after: 60, keepNext: true },
  { id: 'TOCHeading', name: 'TOC Heading', next: 'Normal', size: 32, bold: true, before: 0, after: 180, bottom: heavy },
  { id: 'TOC1', name: 'toc 1', bold: true, before: 140, after: 30 },
  { id: 'TOC2', name: 'toc 2', left: 300, before: 0, after: 20 },
  { id: 'TOC3', name: 'toc 3', left: 600, before: 0, after: 20 },
  { id: 'TableofFigures', name: 'table of figures', before: 0, after: 20 },
  { id: 'Header', name: 'header', size: 16, color: PENCIL, ...tight, bottom: fine },
  { id: 'Footer', name: 'footer', size: 16, color: PENCIL, ...tight, top: fine },
  { id: 'Strong', name: 'Strong', type: 'character', bold: true },
  { id: 'Hyperlink', name: 'Hyperlink', type: 'character' },
  { id: 'IndexLink', name: 'Index Link', type: 'character', custom: true },
  { id: SOURCE_STYLE, name: 'Source', type: 'character', custom: true, size: 15, color: PENCIL },
  { id: SYMBOL_STYLE, name: 'Symbol', type: 'character', custom: true, italic: true },
  { id: SUBSCRIPT_STYLE, name: 'Symbol Subscript', type: 'character', custom: true, subscript: true },
  { id: STYLE.tableText, name: 'Table Text', custom: true, size: 17, ...tight },
  { id: STYLE.tableNumber, name: 'Table Number', custom: true, size: 17, align: 'right', ...tight },
  { id: STYLE.tableHead, name: 'Table Head', custom: true, size: 16, bold: true, keepNext: true, ...tight },
  { id: STYLE.tableHeadNumber, name: 'Table Head Number', custom: true, basedOn: STYLE.tableHead, align: 'right' },
  { id: STYLE.scheduleText, name: 'Schedule Text', custom: true, size: 15, ...tight },
  { id: STYLE.scheduleNumber, name: 'Schedule Number', custom: true, size: 15, align: 'right', ...tight },
  { id: STYLE.scheduleHead, name: 'Schedule Head', custom: true, size: 14, bold: true, keepNext: true, ...tight },
  {
    id: STYLE.scheduleHeadNumber,
    name: 'Schedule Head Number',
    custom: true,
    basedOn: STYLE.scheduleHead,
    align: 'right',
  },
  { id: STYLE.smallText, name: 'Small Schedule Text', custom: true, size: 14, ...tight },
  { id: STYLE.smallNumber, name: 'Small Schedule Number', custom: true, size: 14, align: 'right', ...tight },
  { id: STYLE.smallHead, name: 'Small Schedule Head', custom: true, size: 13, bold: true, keepNext: true, ...tight },
  {
    id: STYLE.smallHeadNumber,
    name: 'Small Schedule Head Number',
    custom: true,
    basedOn: STYLE.smallHead,
    align: 'right',
  },
  {
    id: STYLE.step,
    name: 'Calculation Step',
    custom: true,
    next: STYLE.equation,
    before: 140,
    after: 30,
    keepNext: true,
    keepLines: true,
  },
  { id: STYLE.equation, name: 'Calculation Equation', custom: true, before: 0, after: 40, left: 360, keepLines: true },
  {
    id: STYLE.answer,
    name: 'Calculation Answer',
    custom: true,
    next: 'Normal',
    bold: true,
    before: 200,
    after: 160,
    keepLines: true,
    top: heavy,
    bottom: heavy,
  },
  { id: STYLE.remark, name: 'Remark', custom: true, size: 16, color: PENCIL, before: 60, after: 60 },
  {
    id: STYLE.zone,
    name: 'Zone',
    custom: true,
    size: 16,
    color: PENCIL,
    bold: true,
    letterSpacing: 20,
    before: 240,
    after: 60,
    keepNext: true,
  },
  {
    id: STYLE.draft,
    name: 'Draft Warning',
    custom: true,
    size: 18,
    bold: true,
    color: OCHRE,
    align: 'center',
    before: 0,
    after: 60,
  },
  // The sentences belong together: none is left alone on the next page.
  { id: STYLE.caution, name: 'Caution', custom: true, keepNext: true, keepLines: true },
  // The caption of a table stands above it, that of a figure below: each is kept with what it names.
  { id: STYLE.figure, name: 'Figure', custom: true, before: 160, after: 40, keepNext: true },
  {
    id: STYLE.figureCaption,
    name: 'Figure Caption',
    custom: true,
    basedOn: 'Caption',
    before: 0,
    after: 220,
    keepNext: false,
  },
  { id: STYLE.note, name: 'Keyed Note', custom: true, size: 16, left: 360, hanging: 360, before: 0, after: 30 },
]

// Heavy rules above and below, a fine rule under the head, hair lines between rows, no vertical lines: as on the screen.
const TABLE = `<w:style w:type="table" w:default="1" w:styleId="TableNormal"><w:name w:val="Normal Table"/><w:uiPriority w:val="99"/><w:semiHidden/><w:tblPr><w:tblInd w:w="0" w:type="dxa"/><w:tblCellMar><w:left w:w="0" w:type="dxa"/><w:right w:w="0" w:type="dxa"/></w:tblCellMar></w:tblPr></w:style>
<w:style w:type="table" w:customStyle="1" w:styleId="${TABLE_STYLE}"><w:name w:val="Coldfill Table"/><w:basedOn w:val="TableNormal"/><w:qFormat/><w:tblPr><w:tblBorders><w:top w:val="single" w:sz="12" w:space="0" w:color="${INK}"/><w:bottom w:val="single" w:sz="12" w:space="0" w:color="${INK}"/><w:insideH w:val="single" w:sz="4" w:space="0" w:color="${HAIR}"/></w:tblBorders><w:tblCellMar><w:top w:w="40" w:type="dxa"/><w:left w:w="70" w:type="dxa"/><w:bottom w:w="40" w:type="dxa"/><w:right w:w="70" w:type="dxa"/></w:tblCellMar></w:tblPr><w:tblStylePr w:type="firstRow"><w:tcPr><w:tcBorders><w:bottom w:val="single" w:sz="8" w:space="0" w:color="${INK}"/></w:tcBorders><w:shd w:val="clear" w:color="auto" w:fill="${WELL}"/><w:vAlign w:val="bottom"/></w:tcPr></w:tblStylePr></w:style>`

const DEFAULTS = `<w:docDefaults><w:rPrDefault><w:rPr><w:rFonts w:ascii="${BODY_FONT}" w:hAnsi="${BODY_FONT}" w:eastAsia="${BODY_FONT}" w:cs="${BODY_FONT}"/><w:color w:val="${INK}"/><w:sz w:val="19"/><w:szCs w:val="19"/><w:lang w:val="en-US" w:eastAsia="en-US" w:bidi="ar-SA"/></w:rPr></w:rPrDefault><w:pPrDefault><w:pPr><w:spacing w:after="100" w:line="264" w:lineRule="auto"/></w:pPr></w:pPrDefault></w:docDefaults>`

/** The styles part of the submittal. */
export const stylesXml = `<?xml version="1.0" encoding="UTF-8" standalone="yes"?>
<w:styles xmlns:w="http://schemas.openxmlformats.org/wordprocessingml/2006/main">${DEFAULTS}${DEFINITIONS.map(styleXml).join('')}${TABLE}</w:styles>`
