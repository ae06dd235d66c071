import {
  BuilderElement,
  Paragraph,
  Table,
  TableCell,
  TableLayoutType,
  TableRow,
  TextRun,
  WidthType,
  type XmlComponent,
} from 'docx'
import type { Box } from '@coldfill/formula'
import { symbolRuns } from './symbol-runs.ts'
import { columnWidths, type TableSize } from './column-widths.ts'
import { commented } from './review-comments.ts'
import { plainText } from './plain-text.ts'
import { STYLE, TABLE_STYLE } from './styles.ts'

export interface TableColumn {
  readonly heading: string
  /** Share of the width. */
  readonly width: number
  readonly align?: 'left' | 'right' | 'center'
}

/** Words, or a symbol with its subscript. */
export type TableCellContent = string | Box

export interface TableContent {
  readonly columns: readonly TableColumn[]
  readonly rows: readonly (readonly TableCellContent[])[]
  /** Said by a screen reader and shown in the properties of the table. */
  readonly title: string
  readonly description: string
  /** Twips. */
  readonly width: number
  readonly size?: TableSize
  /** Words of the first column in the built-in style Strong. */
  readonly strongFirst?: boolean
  /** Ids of the comments on a cell of the body, by its row and column. */
  readonly comments?: (row: number, column: number) => readonly number[]
  /** Least height of body rows in twips, for cells that a person fills in. */
  readonly rowHeight?: number
}

const STYLES = {
  table: { head: STYLE.tableHead, headNumber: STYLE.tableHeadNumber, text: STYLE.tableText, number: STYLE.tableNumber },
  schedule: {
    head: STYLE.scheduleHead,
    headNumber: STYLE.scheduleHeadNumber,
    text: STYLE.scheduleText,
    number: STYLE.scheduleNumber,
  },
  small: { head: STYLE.smallHead, headNumber: STYLE.smallHeadNumber, text: STYLE.smallText, number: STYLE.smallNumber },
}

class DescribedTable extends Table {
  describe(title: string, description: string): this {
    const properties = this.root[0] as XmlComponent
    for (const [name, value] of [
      ['w:tblCaption', title],
      ['w:tblDescription', description],
    ] as const) {
      properties.addChildElement(
        new BuilderElement<{ value: string }>({
          name,
          attributes: { value: { key: 'w:val', value: plainText(value) } },
        }),
      )
    }
    return this
  }
}

/** A table with a repeating head row, rows that stay whole, and nothing merged. */
export const table = (content: TableContent): Table => {
  const { columns, rows, width } = content
  const widths = columnWidths(columns, rows, width, content.size ?? 'table', content.strongFirst)
  const style = STYLES[content.size ?? 'table']
  const cell = (
    content: TableCellContent,
    index: number,
    paragraphStyle: string,
    strong = false,
    comments: readonly number[] = [],
  ) =>
    new TableCell({
      width: { size: widths[index] ?? 0, type: WidthType.DXA },
      children: [
        new Paragraph({
          style: paragraphStyle,
          children: commented(
            comments,
            typeof content === 'string'
              ? [new TextRun({ text: plainText(content), ...(strong ? { style: 'Strong' } : {}) })]
              : symbolRuns(content),
          ),
        }),
      ],
    })
  return new DescribedTable({
    style: TABLE_STYLE,
    layout: TableLayoutType.FIXED,
    width: { size: width, type: WidthType.DXA },
    columnWidths: widths,
    tableLook: { firstRow: true, lastRow: false, firstColumn: false, lastColumn: false, noHBand: true, noVBand: true },
    rows: [
      new TableRow({
        tableHeader: true,
        cantSplit: true,
        children: columns.map((column, index) =>
          cell(column.heading, index, column.align === 'right' ? style.headNumber : style.head),
        ),
      }),
      ...rows.map(
        (row, place) =>
          new TableRow({
            cantSplit: true,
            ...(content.rowHeight === undefined
              ? {}
              : { height: { value: content.rowHeight, rule: 'atLeast' as const } }),
            children: columns.map((column, index) =>
              cell(
                row[index] ?? '',
                index,
                column.align === 'right' ? style.number : style.text,
                content.strongFirst === true && index === 0,
                content.comments?.(place, index),
              ),
            ),
          }),
      ),
    ],
  }).describe(content.title, content.description)
}
