/** Said wherever a result leaves the program. */
export const cautions: readonly string[] = [
  'Pressure vessels and hot water can injure and kill.',
  "These results are an aid to licensed engineering judgement. The adopted codes, the authority having jurisdiction and the vessel's own listing govern.",
  'A relief valve is never an expansion control.',
  'Water stored at or above 60\u00A0°C (140\u00A0°F) against legionella needs tempering against scalding.',
  'Isolate, depressurise and drain a vessel before its precharge is read or changed.',
]

export const caution = cautions.join(' ')
