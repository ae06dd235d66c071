export {
  CONSTRUCTION_STATUS,
  type AssumptionChangeEntry,
  type ChangedEntry,
  type DispositionEntry,
  type DocumentOptions,
  type Logo,
  type RedlineAnchor,
  type RedlineEntry,
  type RedlinePerson,
  type RevisionEntry,
  type TitleBlock,
} from './document-options.ts'
export { writeSchedule } from './xlsx/write-schedule.ts'
export { writeReviewCopy, writeSubmittal, type SubmittalSurroundings } from './submittal/write-submittal.ts'
export { printSubmittal, type PrintedSubmittal, type PrintStage } from './submittal/print-submittal.ts'
export { officePages, pagesBy } from './pages/office-pages.ts'
export { type Office, OfficeFailure, openOffice } from './pages/office.ts'
export type { PageFinder } from './pages/page-tokens.ts'
export { fileName, type DocumentKind } from './file-name.ts'
export {
  headerText,
  scheduleKinds,
  scheduleTable,
  type ScheduleCell,
  type ScheduleColumn,
  type ScheduleRow,
  type ScheduleTable,
} from '@coldfill/presentation'
export { maxCatalogueBytes, readCatalogueFile } from './catalogue/read-catalogue-file.ts'
