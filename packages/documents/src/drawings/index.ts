// The drawings alone, for a caller that has no use for the libraries that write documents.
export { acceptanceDrawing } from './acceptance-drawing.ts'
export { pressureDrawing } from './pressure-drawing.ts'
