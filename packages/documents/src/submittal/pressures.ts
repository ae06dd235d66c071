import { leadIn } from '../docx/paragraph.ts'
import { gaugeRemark } from '../words/pressure-words.ts'
import { figure } from './pictures.ts'
import type { Section } from './section.ts'

export const pressureKey = (system: string): string => `pressures of ${system}`

/** Pressure against height of every system whose pressure a vessel holds. */
export const pressures: Section = ({ result, options, headings, captions, pictures }) => {
  const drawn = result.systems.flatMap((system) => {
    const picture = pictures.pressures.get(system)
    return picture ? [{ system, picture }] : []
  })
  if (drawn.length === 0) return []
  return [
    headings.heading('System pressures', 1),
    leadIn(
      `Cold is the system filled and at rest, hot the highest pressure with the chosen vessel, or with the smallest that is enough where none is chosen. ${gaugeRemark(options.units)}`,
    ),
    ...drawn.flatMap(({ system, picture }) =>
      figure(picture, `${system.title}, pressure against height`, captions, pressureKey(system.id)),
    ),
  ]
}
