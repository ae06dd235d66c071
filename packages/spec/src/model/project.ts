import { choice, quantity, text } from './field.ts'

/** Keys of `project:` with one value each. `codes:` and `spec-sections:` are maps and stand below. */
export const projectFields = {
  number: text('Number of the project, as printed in the title block.', 'FC-241'),
  title: text('Title of the project, as printed on every sheet.', 'Fernhollow Community Clinic'),
  client: text('Whom the work is for.', 'Fernhollow Health Trust'),
  location: text('Where the building stands.', 'Tarn Valley'),
  elevation: quantity(
    ['length'],
    'Height of the site above sea level. It sets the atmospheric pressure that turns gauge into absolute pressures.',
    '5200 ft',
    { fallback: 'sea level, and then an assumption' },
  ),
  units: choice(
    {
      US: 'gal, psig, °F, MBH',
      SI: 'L, kPa, °C, kW',
    },
    'Units that schedules and documents show. Any unit may be typed anywhere.',
    'US',
    { fallback: 'US' },
  ),
}

/** Keys of `project: codes:`. The value is the code with its year, as typed. */
export const codeFields = {
  plumbing: text('Plumbing code that the project adopts. It decides the pressure limit at fixtures.', 'UPC 2024'),
  mechanical: text(
    'Mechanical code that the project adopts. It decides the least volume of a heating expansion tank.',
    'IMC 2021',
  ),
}

/** What `project: spec-sections:` holds: kind of vessel → section number, as typed. */
export const specSectionField = text('Number of the specification section for this kind of vessel.', '23 21 16')
