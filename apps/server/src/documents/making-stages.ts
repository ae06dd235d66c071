/** Stages of making the files of a revision, in order; a making holds the number of the one it is in. */
export const MAKING_STAGES = [
  'Waiting',
  'Writing the schedule',
  'Writing the submittal',
  'Laying out the pages',
  'Printing the PDF',
  'Storing the files',
] as const
