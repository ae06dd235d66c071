import { code, type EngineeringCodeHelp, local, memory } from './code.ts'

/** Findings about the choice of a vessel. */
export const choiceCodes = {
  'CF-E030': code(
    'error',
    'The chosen vessel is too small',
    'The expansion does not fit into the chosen vessel.',
    'The relief valve would open.',
    'Choose a larger vessel.',
    'Law of Boyle and Mariotte.',
  ),
  'CF-E031': code(
    'warning',
    'No row of the catalogue fits',
    'No row of the office catalogue, nor several equal ones, satisfies what the vessel needs.',
    'The required values stand on the schedule alone; a vessel has still to be found.',
    'Add vessels to the catalogue, or write `selection: none` to schedule the required values.',
    'Rule of this program.',
  ),
  'CF-E032': code(
    'error',
    'The chosen row is not in the catalogue',
    'The maker and model that the spec fixes do not stand in the office catalogue.',
    'Without its volume and ratings the choice cannot be checked.',
    'Correct the maker or model, or add the row to the catalogue.',
    'Rule of this program.',
  ),
  'CF-E033': code(
    'error',
    'The chosen vessel does not satisfy the duty',
    'The row that the spec fixes falls short of what the vessel needs.',
    'A vessel that is too small or rated too low opens the relief valve or fails.',
    'Choose another row, or write `selection: auto`.',
    'Required volume, acceptance volume and ratings of the vessel.',
  ),
  'CF-E034': code(
    'note',
    'The next size down, and equal sizes',
    'What the next smaller row lacks, and which rows would do as well as the chosen one.',
    'A small change of an input may save or cost a size.',
    'Nothing has to be done.',
    'Rule of this program.',
  ),
  'CF-E035': code(
    'note',
    'Hung vessel above the usual size',
    'A vessel that is hung from piping or a wall is larger than the sizes usually hung.',
    'A membrane may fail and the whole shell fill with water; piping carries only small vessels, as their listing says.',
    'Stand the vessel on the floor, or show its supports: twice the weight full of water.',
    `Common practice, no source; UMC 1004.1 for the supports. ${local}`,
  ),
  'CF-E036': code(
    'note',
    'The pressure vessel code may ask for a stamp',
    'Volume, pressure, temperature or heat input lies outside the exemptions of the pressure vessel code.',
    'Exemptions end when any one limit is exceeded; local law and project specifications may be stricter.',
    'Write `stamp: yes`, and schedule the rating.',
    `ASME BPVC VIII-1 U-1(c)(2) and HLW-101.2 (${memory}). ${local}`,
  ),
  'CF-E037': code(
    'note',
    'Conformity category of the vessel',
    'Pressure times volume of a vessel made to EN 13831 decides its category under the pressure equipment directive.',
    'The category decides who assesses the vessel and what papers come with it; some places ask for inspections above a limit.',
    'Schedule the category, and ask for the declaration of conformity.',
    `Directive 2014/68/EU, Article 4 and Annex II, vessels for gases of group 2 (${memory}). ${local}`,
  ),
} as const satisfies Record<string, EngineeringCodeHelp>
