export { displayNumber } from './display-number.ts'
export { numberText, valueText } from './value-text.ts'
export { drawAcceptance } from './drawings/acceptance-drawing.ts'
export { drawPressures } from './drawings/pressure-drawing.ts'
export { ON_PAPER, PAPER, type Drawing, type DrawingLook, type Palette, type Shape } from './drawings/shape.ts'
export { svgText } from './drawings/svg-text.ts'
export { methodWords, numberRanges, numbersOf, sentenceCase, statusWords } from './vessel-words.ts'
export { decimalsFor } from './schedules/column-decimals.ts'
export {
  headerText,
  scheduleKinds,
  scheduleTable,
  type ScheduleCell,
  type ScheduleColumn,
  type ScheduleRow,
  type ScheduleTable,
} from './schedules/schedule-table.ts'
export { findingWords } from './finding-words.ts'
